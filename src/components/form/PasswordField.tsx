import { useState, type ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';

export interface PasswordFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  /** `current-password` to sign in, `new-password` to make one. */
  autoComplete: 'current-password' | 'new-password';
}

export function PasswordField({ name, label, hint, autoComplete }: PasswordFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, hint !== undefined);
  const [shown, setShown] = useState(false);
  return (
    <Field label={label} hint={hint} state={state}>
      <div className="relative">
        <input
          type={shown ? 'text' : 'password'}
          id={state.id}
          autoComplete={autoComplete}
          autoCapitalize="none"
          spellCheck={false}
          {...state.aria}
          {...register(name)}
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
