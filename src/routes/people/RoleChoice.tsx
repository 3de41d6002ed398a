import { useId } from 'react';
import { ROLES, type Role } from '#shared/api/people.ts';
import { ROLE_MEANING, ROLE_WORDS } from '../../app/words.ts';

export interface RoleChoiceProps {
  legend: string;
  role: Role;
  onChoose: (role: Role) => void;
}

/** What somebody may do, each role with its meaning. */
export function RoleChoice({ legend, role, onChoose }: RoleChoiceProps) {
  const name = useId();
  return (
    <fieldset className="space-y-1">
      <legend className="mb-1 font-semibold">{legend}</legend>
      {ROLES.map((value) => (
        <label key={value} className="flex min-h-11 items-start gap-2.5 py-1.5">
          <input
            type="radio"
            name={name}
            checked={role === value}
            onChange={() => onChoose(value)}
            className="mt-0.5 size-5 shrink-0 accent-bottle"
          />
          <span>
            <span className="font-medium">{ROLE_WORDS[value]}.</span>{' '}
            <span className="text-ink2">{ROLE_MEANING[value]}</span>
          </span>
        </label>
      ))}
    </fieldset>
  );
}
