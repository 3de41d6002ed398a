import type { ReactNode } from 'react';
import { useFormContext } from 'react-hook-form';
import { FieldError } from './FieldError.tsx';
import { useField } from './useField.ts';

export interface CheckFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  className?: string;
}

export const CHECK_LABEL = 'flex min-h-9 items-center gap-2.5 text-body max-tablet:min-h-11';
export const CHECK_BOX = 'size-5 shrink-0 accent-bottle';

export function CheckField({ name, label, hint, className }: CheckFieldProps) {
  const { register } = useFormContext();
  const state = useField(name, hint !== undefined);
  return (
    <div className={className}>
      <label className={CHECK_LABEL}>
        <input type="checkbox" {...state.aria} {...register(name)} className={CHECK_BOX} />
        <span className="font-medium">{label}</span>
      </label>
      <FieldError id={state.errorId} message={state.message} />
      {hint && (
        <p id={state.hintId} className="pl-7.5 text-small text-ink2">
          {hint}
        </p>
      )}
    </div>
  );
}
