import type { ComponentProps, ReactNode } from 'react';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import type { FieldState } from './fieldState.ts';

export interface TextBoxProps extends ComponentProps<'input'> {
  label: ReactNode;
  hint?: ReactNode;
  state: FieldState;
}

/** One line of text with its label, its hint and what is wrong with it. */
export function TextBox({ label, hint, state, className, ...input }: TextBoxProps) {
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <input
        type="text"
        id={state.id}
        {...input}
        {...state.aria}
        className={fieldClass(state.message !== undefined)}
      />
    </Field>
  );
}
