import { useId } from 'react';
import { get, useFormContext } from 'react-hook-form';
import { fieldState, type FieldState } from './fieldState.ts';

/** One field of a form as its contract judged it last. */
export function useField(name: string, hasHint: boolean): FieldState {
  const { formState } = useFormContext();
  const own = useId();
  const found: unknown = get(formState.errors, name);
  return fieldState(own, messageOf(found), hasHint);
}

function messageOf(error: unknown): string | undefined {
  if (typeof error !== 'object' || error === null || !('message' in error)) return undefined;
  return typeof error.message === 'string' ? error.message : undefined;
}
