import { useMemo, useState } from 'react';
import { z } from 'zod';
import { season as seasonContract, weekday, type Season } from '#shared/api/brewery.ts';
import { id, name } from '#shared/api/fields.ts';
import { useSeasonPatch } from '../../api/season.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { RowForm } from '../../components/form/RowForm.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { written } from '../../components/form/written.ts';
import { say } from '../../components/ui/Toast.tsx';
import { WeekdayField } from './WeekdayField.tsx';
import { weekdayWords } from './weekdays.ts';

/** The season patch without its blocked days, which have a list of their own. */
const contract = z.strictObject({
  id,
  name,
  brewWeekdays: z.array(weekday).max(7),
  brewsPerDay: z.number().int().min(1).max(20),
});

const LABELS: Record<string, string> = {
  name: 'Name of the season',
  brewWeekdays: 'Brew days',
  brewsPerDay: 'Brews a day',
};

export function SeasonForm({ season }: { season: Season }) {
  const [generation, setGeneration] = useState(0);
  // A saved form starts afresh from the row as it is then.
  return <Fields key={generation} season={season} onDone={() => setGeneration(generation + 1)} />;
}

function Fields({ season, onDone }: { season: Season; onDone: () => void }) {
  const { slug } = useBrewery();
  const units = useUnits();
  const patch = useSeasonPatch(slug);
  const values = useMemo(
    () => ({
      id: season.id,
      name: season.name,
      brewWeekdays: season.brewWeekdays,
      brewsPerDay: written('count', season.brewsPerDay, units),
    }),
    [season, units],
  );
  return (
    <RowForm
      row={season}
      rowSchema={seasonContract}
      contract={contract}
      keepsTyped={false}
      values={values}
      create={() => Promise.resolve()}
      patch={patch.mutateAsync}
      labelOf={(key) => LABELS[key] ?? key}
      wordsOf={(key, facts) =>
        key === 'brewWeekdays'
          ? weekdayWords(facts.brewWeekdays ?? [])
          : String(key === 'name' ? facts.name : facts.brewsPerDay)
      }
      action="Save"
      follows
      onDone={() => {
        say('Saved.');
        onDone();
      }}
    >
      <TextField name="name" label="Name of the season" autoComplete="off" />
      <WeekdayField />
      <QuantityField
        name="brewsPerDay"
        label="Brews a day"
        hint="A day with this many brews is full."
        className="max-w-64"
      />
    </RowForm>
  );
}
