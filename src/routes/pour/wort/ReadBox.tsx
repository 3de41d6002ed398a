import { useId } from 'react';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { fieldClass } from '../../../components/form/fieldClass.ts';
import type { Written } from '../../../components/form/written.ts';

interface ReadBoxProps {
  label: string;
  hint?: string | undefined;
  now: Written;
  fault: string | null;
  onText: (text: string) => void;
}

/** A number that was read, in the person's unit. */
export function ReadBox({ label, hint, now, fault, onText }: ReadBoxProps) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="mb-1 block font-semibold">
        {label}
      </label>
      <div className="relative">
        <input
          id={id}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={now.text}
          aria-invalid={fault !== null}
          aria-describedby={`${id}-unit ${id}-why ${id}-hint`}
          onChange={(event) => onText(event.target.value)}
          className={fieldClass(fault !== null, 'pr-14 min-h-13')}
        />
        <span
          id={`${id}-unit`}
          className="pointer-events-none absolute inset-y-0 right-3 grid place-items-center text-ink2"
        >
          {now.unit}
        </span>
      </div>
      <FieldError id={`${id}-why`} message={fault ?? undefined} />
      {hint && (
        <p id={`${id}-hint`} className="mt-1 text-small text-ink2">
          {hint}
        </p>
      )}
    </div>
  );
}
