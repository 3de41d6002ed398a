import type { ListedSeason } from '#shared/api/brewery.ts';
import type { Day } from '#shared/rules/vocabulary.ts';
import { formatDayShort } from '#shared/units/day.ts';
import { count } from '../../board/view/words.ts';

const dated = (day: Day) => `${formatDayShort(day)} ${day.slice(0, 4)}`;

/** "3 Apr 2027 to 30 Jun 2027", "from 3 Apr 2027"; empty where nothing was set. */
export function daysOf({ firstDay, lastDay }: Pick<ListedSeason, 'firstDay' | 'lastDay'>): string {
  if (firstDay && lastDay) return `${dated(firstDay)} to ${dated(lastDay)}`;
  if (firstDay) return `from ${dated(firstDay)}`;
  return lastDay ? `until ${dated(lastDay)}` : '';
}

/** "3 Apr 2027 to 30 Jun 2027 · 3 shelves, 8 batches". */
export function seasonFacts(season: ListedSeason): string {
  const { chains, batches } = season;
  const stands =
    chains + batches === 0
      ? 'nothing on it yet'
      : `${count(chains, 'shelf', 'shelves')}, ${count(batches, 'batch', 'batches')}`;
  return [daysOf(season), stands].filter(Boolean).join(' · ');
}
