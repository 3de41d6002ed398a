import { useController } from 'react-hook-form';
import { WEEKDAYS } from './weekdays.ts';

/** Weekdays on which the brewery brews; dates are moved to the next of them that is free. */
export function WeekdayField() {
  const { field } = useController({ name: 'brewWeekdays' });
  const chosen = field.value as number[];
  const toggle = (day: number, on: boolean) =>
    field.onChange(
      WEEKDAYS.map((one) => one.day).filter((one) => (one === day ? on : chosen.includes(one))),
    );
  return (
    <fieldset>
      <legend className="mb-1 font-semibold">Brew days</legend>
      <div className="flex flex-wrap gap-2">
        {WEEKDAYS.map(({ day, name }, index) => (
          <label
            key={day}
            className="grid min-h-10 min-w-14 place-items-center rounded-field border-[1.5px] border-edge bg-white px-3 has-checked:border-bottle has-checked:bg-bottle-l has-checked:font-semibold has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-bottle max-tablet:min-h-11"
          >
            <input
              type="checkbox"
              ref={index === 0 ? field.ref : undefined}
              className="sr-only"
              checked={chosen.includes(day)}
              onChange={(event) => toggle(day, event.target.checked)}
            />
            <span aria-hidden="true">{name.slice(0, 3)}</span>
            <span className="sr-only">{name}</span>
          </label>
        ))}
      </div>
    </fieldset>
  );
}
