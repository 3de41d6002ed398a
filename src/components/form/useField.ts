import { useId } from 'react';
import { get, useFormContext } from 'react-hook-form';

export interface FieldState {
  id: string;
  errorId: string;
  hintId: string;
  message: string | undefined;
  /** For the control itself. */
  aria: { 'aria-invalid': boolean; 'aria-describedby': string | undefined };
}

/** The ids and the error of one field; the control points to both by `aria-describedby`. */
export function useField(name: string, hasHint: boolean): FieldState {
  const { formState } = useFormContext();
  const own = useId();
  const found: unknown = get(formState.errors, name);
  const message = messageOf(found);
  const id = `${own}-field`;
  const errorId = `${own}-error`;
  const hintId = `${own}-hint`;
  const described = [message && errorId, hasHint && hintId].filter(Boolean).join(' ');
  return {
    id,
    errorId,
    hintId,
    message,
    aria: { 'aria-invalid': message !== undefined, 'aria-describedby': described || undefined },
  };
}

function messageOf(error: unknown): string | undefined {
  if (typeof error !== 'object' || error === null || !('message' in error)) return undefined;
  return typeof error.message === 'string' ? error.message : undefined;
}
