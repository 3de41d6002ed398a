import type { ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface NoteFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  rows?: number;
  className?: string;
}

export function NoteField({ name, label, hint, rows = 3, className }: NoteFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, hint !== undefined);
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <textarea
        id={state.id}
        rows={rows}
        {...state.aria}
        {...register(name)}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
