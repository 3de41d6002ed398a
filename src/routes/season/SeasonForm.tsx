import { useMemo, useState } from 'react';
import { z } from 'zod';
import {
  daysInOrder,
  season as seasonContract,
  weekday,
  type Season,
} from '#shared/api/brewery.ts';
import { day, id, name } from '#shared/api/fields.ts';
import { formatDay } from '#shared/units/day.ts';
import { useSeasonPatch } from '../../api/season.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { written } from '../../components/form/written.ts';
import { say } from '../../components/ui/Toast.tsx';
import { SeasonFields } from './SeasonFields.tsx';
import { weekdayWords } from './weekdays.ts';

/** The season patch without its blocked days, which have a list of their own. */
const contract = z
  .strictObject({
    id,
    name,
    firstDay: day.nullable(),
    lastDay: day.nullable(),
    brewWeekdays: z.array(weekday).max(7),
    brewsPerDay: z.number().int().min(1).max(20),
  })
  .superRefine(daysInOrder);
type Facts = Partial<Omit<z.infer<typeof contract>, 'id'>>;

const LABELS: Record<string, string> = {
  name: 'Name of the season',
  firstDay: 'First day',
  lastDay: 'Last day',
  brewWeekdays: 'Brew days',
  brewsPerDay: 'Brews a day',
};

function wordsOf(key: string, facts: Facts): string {
  switch (key) {
    case 'name':
      return facts.name ?? '';
    case 'firstDay':
    case 'lastDay':
      return facts[key] ? formatDay(facts[key]) : 'left open';
    case 'brewWeekdays':
      return weekdayWords(facts.brewWeekdays ?? []);
    default:
      return String(facts.brewsPerDay);
  }
}

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
      firstDay: season.firstDay,
      lastDay: season.lastDay,
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
      wordsOf={wordsOf}
      action="Save"
      follows
      onDone={() => {
        say('Saved.');
        onDone();
      }}
    >
      <SeasonFields />
    </RowForm>
  );
}
