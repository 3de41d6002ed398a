import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface PickerFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  className?: string;
}

interface Picker {
  type: 'date' | 'datetime-local';
  min: string;
  max: string;
}

/** A text of the browser's own picker; empty is null. */
export function PickerField(props: PickerFieldProps & { picker: Picker }) {
  const { name, label, hint, className, picker } = props;
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <input
        id={state.id}
        {...picker}
        {...state.aria}
        {...field}
        value={(field.value as string | null) ?? ''}
        onChange={(event) => field.onChange(event.target.value || null)}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
