import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { FieldError } from './FieldError.tsx';
import type { Option } from './SelectField.tsx';
import { useField } from './useField.ts';

export interface SegmentedFieldProps {
  name: string;
  label: ReactNode;
  options: readonly Option[];
  hint?: ReactNode;
  className?: string;
  /** Told of a choice, after the form knows it. */
  onPicked?: (value: string) => void;
}

/** One of two to four, all in sight: radio buttons drawn as one bar. */
export function SegmentedField(props: SegmentedFieldProps) {
  const { name, label, options, hint, className, onPicked } = props;
  const state = useField(name, hint !== undefined);
  const { field } = useController({ name });
  return (
    <fieldset className={className} aria-describedby={state.aria['aria-describedby']}>
      <legend className="mb-1 text-body font-semibold">{label}</legend>
      <div className="inline-flex max-w-full overflow-hidden rounded-field border-[1.5px] border-edge bg-white">
        {options.map((option, index) => (
          <label
            key={option.value}
            className="grid min-h-10 place-items-center border-edge px-4 text-center text-body leading-tight not-first:border-l-[1.5px] has-checked:bg-bottle has-checked:font-semibold has-checked:text-on-bottle has-focus-visible:outline-3 has-focus-visible:-outline-offset-4 has-focus-visible:outline-current max-tablet:min-h-11 max-tablet:px-3"
          >
            <input
              type="radio"
              ref={index === 0 ? field.ref : undefined}
              name={state.id}
              value={option.value}
              checked={field.value === option.value}
              onChange={() => {
                field.onChange(option.value);
                onPicked?.(option.value);
              }}
              className="sr-only"
            />
            {option.label}
          </label>
        ))}
      </div>
      <FieldError id={state.errorId} message={state.message} />
      {hint && (
        <p id={state.hintId} className="mt-1 text-small text-ink2">
          {hint}
        </p>
      )}
    </fieldset>
  );
}
