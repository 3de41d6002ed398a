import type { ComponentProps, ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface TextFieldProps extends Omit<ComponentProps<'input'>, 'name'> {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
}

export function TextField({ name, label, hint, className, ...rest }: TextFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, hint !== undefined);
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <input
        type="text"
        id={state.id}
        {...rest}
        {...state.aria}
        {...register(name)}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
