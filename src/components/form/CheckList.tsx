import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { CHECK_BOX, CHECK_LABEL } from './CheckField.tsx';
import { FieldError } from './FieldError.tsx';
import type { Option } from './SelectField.tsx';
import { useField } from './useField.ts';

export interface CheckListProps {
  name: string;
  label: ReactNode;
  options: readonly Option[];
  hint?: ReactNode;
  /** A box that says "not known": the value is then null, not an empty list. */
  unknown?: string;
}

/** Any number out of a short list. The list keeps the order of the options. */
export function CheckList({ name, label, options, hint, unknown }: CheckListProps) {
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  const chosen = field.value as string[] | null;
  const toggle = (value: string, on: boolean) => {
    const next = new Set(chosen ?? []);
    if (on) next.add(value);
    else next.delete(value);
    field.onChange(options.map((o) => o.value).filter((v) => next.has(v)));
  };
  return (
    <fieldset aria-describedby={state.aria['aria-describedby']}>
      <legend className="mb-1 text-body font-semibold">{label}</legend>
      {hint && (
        <p id={state.hintId} className="mb-1 text-small text-ink2">
          {hint}
        </p>
      )}
      <div className="grid grid-cols-[repeat(auto-fill,minmax(9rem,1fr))] gap-x-4">
        {options.map((option, index) => (
          <label key={option.value} className={CHECK_LABEL}>
            <input
              type="checkbox"
              ref={index === 0 ? field.ref : undefined}
              className={CHECK_BOX}
              checked={chosen?.includes(option.value) ?? false}
              onChange={(event) => toggle(option.value, event.target.checked)}
            />
            {option.label}
          </label>
        ))}
        {unknown && (
          <label className={CHECK_LABEL}>
            <input
              type="checkbox"
              className={CHECK_BOX}
              checked={chosen === null}
              onChange={(event) => field.onChange(event.target.checked ? null : [])}
            />
            {unknown}
          </label>
        )}
      </div>
      <FieldError id={state.errorId} message={state.message} />
    </fieldset>
  );
}
