import type { ReactNode } from 'react';
import { FieldError } from './FieldError.tsx';
import type { FieldState } from './fieldState.ts';

export interface FieldProps {
  label: ReactNode;
  hint?: ReactNode;
  state: FieldState;
  children: ReactNode;
  className?: string | undefined;
}

/** Label above, control, what is wrong, what helps. */
export function Field({ label, hint, state, children, className }: FieldProps) {
  return (
    <div className={className}>
      <label htmlFor={state.id} className="mb-1 block text-body font-semibold">
        {label}
      </label>
      {children}
      <FieldError id={state.errorId} message={state.message} />
      {hint && (
        <p id={state.hintId} className="mt-1 text-small text-ink2">
          {hint}
        </p>
      )}
    </div>
  );
}
