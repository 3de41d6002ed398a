import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface Option {
  value: string;
  label: string;
}

export interface SelectFieldProps {
  name: string;
  label: ReactNode;
  options: readonly Option[];
  hint?: ReactNode;
  /** Offers a first entry that stands for nothing chosen (null). */
  none?: string;
  className?: string;
  /** Told of a choice, after the form knows it. */
  onPicked?: (value: string | null) => void;
}

export function SelectField(props: SelectFieldProps) {
  const { name, label, options, hint, none, className, onPicked } = props;
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <select
        id={state.id}
        {...state.aria}
        {...field}
        value={(field.value as string | null) ?? ''}
        onChange={(event) => {
          const value = event.target.value || (none === undefined ? '' : null);
          field.onChange(value);
          onPicked?.(value || null);
        }}
        className={fieldClass(state.message !== undefined)}
      >
        {none !== undefined && <option value="">{none}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </Field>
  );
}
