export interface ChoiceProps<V extends string> {
  label: string;
  name: string;
  value: V;
  options: readonly { value: V; label: string }[];
  disabled: boolean;
  onChoose: (value: V) => void;
}

/** Two or three radio buttons that take effect at once. */
export function Choice<V extends string>(props: ChoiceProps<V>) {
  const { label, name, value, options, disabled, onChoose } = props;
  return (
    <fieldset disabled={disabled}>
      <legend className="mb-1 font-semibold">{label}</legend>
      <div className="flex flex-wrap gap-2">
        {options.map((option) => (
          <label
            key={option.value}
            className="flex min-h-11 items-center gap-2.5 rounded-field border-[1.5px] border-edge bg-white px-3.5 has-checked:border-bottle has-checked:bg-bottle-l has-checked:font-semibold"
          >
            <input
              type="radio"
              name={name}
              checked={value === option.value}
              onChange={() => onChoose(option.value)}
              className="size-5 shrink-0 accent-bottle"
            />
            {option.label}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
