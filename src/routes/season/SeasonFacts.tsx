import type { Brewery, Season } from '#shared/api/brewery.ts';
import { formatDay } from '#shared/units/day.ts';
import { Card } from '../../components/ui/Card.tsx';
import { Facts } from '../../components/ui/Facts.tsx';
import { daysOf } from './seasons/seasonWords.ts';
import { weekdayWords } from './weekdays.ts';

export function SeasonFacts({ season, brewery }: { season: Season; brewery: Brewery }) {
  return (
    <Card className="max-w-2xl">
      <Facts
        facts={[
          { term: 'Season', value: season.name },
          { term: 'From and to', value: daysOf(season) || 'left open' },
          { term: 'Brews on', value: weekdayWords(season.brewWeekdays) },
          { term: 'Brews a day', value: season.brewsPerDay },
          {
            term: 'Not on',
            value: season.blockedDays.map(formatDay).join(', ') || 'no day is blocked',
          },
          { term: 'Brewery', value: brewery.name },
          { term: 'Time zone', value: brewery.timeZone },
          { term: 'Currency', value: brewery.currency },
        ]}
      />
    </Card>
  );
}
