import { useId, type ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { useUnits } from '../../app/useUnits.ts';
import { Field } from './Field.tsx';
import { fieldClass } from './fieldClass.ts';
import { useField } from './useField.ts';
import { rewrite, type Written } from './written.ts';

export interface QuantityFieldProps {
  name: string;
  label: ReactNode;
  hint?: ReactNode;
  /** Shown in the empty field: what stands if nothing is written. */
  placeholder?: string;
  /** Replaces the unit at the field's end, as the currency does for money. */
  unit?: string;
  className?: string;
}

/** A number with its unit. It keeps what was typed, decimal comma and all. */
export function QuantityField(props: QuantityFieldProps) {
  const { name, label, hint, placeholder, className } = props;
  const prefs = useUnits();
  const state = useField(name, hint !== undefined);
  const unitId = useId();
  const { field } = useController({ name });
  const now = field.value as Written;
  const unit = props.unit ?? now.unit;
  const described = [unit && unitId, state.aria['aria-describedby']].filter(Boolean).join(' ');
  return (
    <Field label={label} hint={hint} state={state} className={className}>
      <div className="relative">
        <input
          type="text"
          inputMode="decimal"
          autoComplete="off"
          id={state.id}
          ref={field.ref}
          name={field.name}
          value={now.text}
          placeholder={placeholder}
          onBlur={field.onBlur}
          onChange={(event) => field.onChange(rewrite(now, event.target.value, prefs))}
          aria-invalid={state.aria['aria-invalid']}
          aria-describedby={described || undefined}
          className={fieldClass(state.message !== undefined, unit ? 'pr-14' : '')}
        />
        {unit && (
          <span
            id={unitId}
            className="pointer-events-none absolute inset-y-0 right-3 grid place-items-center text-body text-ink2"
          >
            {unit}
          </span>
        )}
      </div>
    </Field>
  );
}
