import type { ReactNode } from 'react';
import { useController } from 'react-hook-form';
import { FieldError } from '../../../components/form/FieldError.tsx';
import { useField } from '../../../components/form/useField.ts';

interface Chip {
  value: string;
  label: ReactNode;
}

interface ChipFieldProps {
  name: string;
  label: string;
  aside?: string;
  chips: readonly Chip[];
  /** `one`: at most one, and a second touch takes it back; `many`: a list. */
  take: 'one' | 'many';
}

const CHIP =
  'flex min-h-9 cursor-pointer items-center gap-2 rounded-chip border-[1.5px] border-edge bg-white px-3 py-1.5 text-body leading-tight has-checked:border-bottle has-checked:bg-bottle-l has-checked:font-bold has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-current max-tablet:min-h-11';

/** Words to choose from, all in sight, for a wet thumb. */
export function ChipField({ name, label, aside, chips, take }: ChipFieldProps) {
  const state = useField(name, false);
  const { field } = useController({ name });
  const chosen: readonly string[] = Array.isArray(field.value)
    ? (field.value as string[])
    : field.value === null
      ? []
      : [String(field.value)];
  const toggle = (value: string) => {
    const isOn = chosen.includes(value);
    if (take === 'one') return field.onChange(isOn ? null : value);
    const others = chosen.filter((one) => one !== value);
    return field.onChange(isOn ? others : [...others, value]);
  };
  return (
    <fieldset aria-describedby={state.aria['aria-describedby']}>
      <legend className="mb-1 flex w-full items-baseline gap-2 text-body font-semibold">
        {label}
        {aside && <span className="ml-auto text-small font-normal text-ink2">{aside}</span>}
      </legend>
      <div className="flex flex-wrap gap-1.5">
        {chips.map((chip, at) => (
          <label key={chip.value} className={CHIP}>
            <input
              type="checkbox"
              ref={at === 0 ? field.ref : undefined}
              checked={chosen.includes(chip.value)}
              onChange={() => toggle(chip.value)}
              className="sr-only"
            />
            {chip.label}
          </label>
        ))}
      </div>
      <FieldError id={state.errorId} message={state.message} />
    </fieldset>
  );
}
