import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface DayFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  className?: string;
}

/** A calendar day, in the browser's own picker; empty is null. */
export function DayField({ name, label, hint, className }: DayFieldProps) {
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <input
        type="date"
        id={state.id}
        min="1900-01-01"
        max="2199-12-31"
        {...state.aria}
        {...field}
        value={(field.value as string | null) ?? ''}
        onChange={(event) => field.onChange(event.target.value || null)}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
