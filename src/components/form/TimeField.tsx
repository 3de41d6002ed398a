import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

interface TimeFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  className?: string;
}

/** A day and a time on the brewery's clock, in the browser's own picker; empty is null. */
export function TimeField({ name, label, hint, className }: TimeFieldProps) {
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <input
        type="datetime-local"
        id={state.id}
        min="1900-01-01T00:00"
        max="2199-12-31T23:59"
        {...state.aria}
        {...field}
        value={(field.value as string | null) ?? ''}
        onChange={(event) => field.onChange(event.target.value || null)}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
