import { useState, type ComponentProps, type ReactNode } from 'react';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import type { FieldState } from './fieldState.ts';

export interface PasswordBoxProps extends ComponentProps<'input'> {
  label: ReactNode;
  hint?: ReactNode;
  state: FieldState;
  /** `current-password` to sign in, `new-password` to make one. */
  autoComplete: 'current-password' | 'new-password';
}

/** A password, hidden until it is to be seen. */
export function PasswordBox({ label, hint, state, ...input }: PasswordBoxProps) {
  const [shown, setShown] = useState(false);
  return (
    <Field label={label} hint={hint} state={state}>
      <div className="relative">
        <input
          {...input}
          type={shown ? 'text' : 'password'}
          id={state.id}
          autoCapitalize="none"
          spellCheck={false}
          {...state.aria}
          className={fieldClass(state.message !== undefined, 'pr-20')}
        />
        <button
          type="button"
          aria-pressed={shown}
          aria-label={shown ? 'Hide the password' : 'Show the password'}
          onClick={() => setShown(!shown)}
          className="absolute inset-y-0 right-0 rounded-field px-4 text-body font-semibold text-ink2 underline underline-offset-4"
        >
          {shown ? 'Hide' : 'Show'}
        </button>
      </div>
    </Field>
  );
}
