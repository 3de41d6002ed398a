import { DayField } from '../../components/form/DayField.tsx';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { WeekdayField } from './WeekdayField.tsx';

/** What a person writes of a season. */
export function SeasonFields() {
  return (
    <>
      <TextField name="name" label="Name of the season" autoComplete="off" />
      <div className="grid gap-5 tablet:grid-cols-2">
        <DayField name="firstDay" label="First day" hint="May be left open." />
        <DayField name="lastDay" label="Last day" hint="May be left open." />
      </div>
      <WeekdayField />
      <QuantityField
        name="brewsPerDay"
        label="Brews a day"
        hint="A day with this many brews is full."
        className="max-w-64"
      />
    </>
  );
}
