import { useState, type ReactNode } from 'react';
import { Field } from '../../components/form/Field.tsx';
import { fieldClass } from '../../components/form/fieldClass.ts';
import { useEntryField } from './EntryForm.tsx';

export interface PasswordFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  /** `current-password` to sign in, `new-password` to make one. */
  autoComplete: 'current-password' | 'new-password';
}

export function PasswordField({ name, label, hint, autoComplete }: PasswordFieldProps) {
  const state = useEntryField(name, hint !== undefined);
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
          name={name}
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
