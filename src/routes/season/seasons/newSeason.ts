import { z } from 'zod';
import type { Board } from '#shared/api/board.ts';
import {
  daysInOrder,
  weekday,
  type ListedSeason,
  type SeasonCopy,
  type SeasonCreate,
} from '#shared/api/brewery.ts';
import * as f from '#shared/api/fields.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { copiedSeason } from '#shared/chain/seasonCopy.ts';
import { addDays, daysBetween, formatDay } from '#shared/units/day.ts';
import { newId } from '../../../app/newId.ts';
import { written } from '../../../components/form/written.ts';
import { count } from '../../board/view/words.ts';

/** The form: the season, and of a copy what goes along and when. */
export const newSeasonContract = z
  .strictObject({
    id: f.id,
    name: f.name,
    firstDay: f.day.nullable(),
    lastDay: f.day.nullable(),
    brewWeekdays: z.array(weekday).max(7),
    brewsPerDay: z.number('Write a number').int('Write a whole number').min(1).max(20),
    chainIds: z.array(f.id),
    bench: z.boolean(),
    brewed: z.enum(['pencilled', 'left-out']),
    by: z.enum(['start', 'shift']),
    startOn: f.day.nullable(),
    shiftDays: z
      .number()
      .int('Write whole days')
      .min(-3700, 'At most 3700 days')
      .max(3700, 'At most 3700 days')
      .nullable(),
  })
  .superRefine(daysInOrder)
  .superRefine(({ by, startOn, shiftDays }, ctx) => {
    const ask = (path: string, message: string) =>
      ctx.addIssue({ code: 'custom', path: [path], message });
    if (by === 'start' && startOn === null) ask('startOn', 'Choose a day');
    if (by === 'shift' && shiftDays === null) ask('shiftDays', 'Write how many days');
  });
export type NewSeason = z.infer<typeof newSeasonContract>;

const YEAR = 364;

/** What the form shows at first: a copy begins a year of whole weeks later. */
export function newSeasonValues(from: ListedSeason | null, board: Board, units: UnitPrefs) {
  const days = board.batches.flatMap(({ brewOn, stage }) =>
    brewOn === null || stage === 'scrapped' ? [] : [brewOn],
  );
  const [first] = days.toSorted();
  return {
    id: newId(),
    name: from ? `${from.name} again`.slice(0, 60) : '',
    firstDay: null as string | null,
    lastDay: null as string | null,
    brewWeekdays: [...board.season.brewWeekdays],
    brewsPerDay: written('count', board.season.brewsPerDay, units),
    chainIds: from ? board.chains.map(({ id }) => id) : [],
    bench: from !== null,
    brewed: 'pencilled',
    by: first === undefined ? 'shift' : 'start',
    startOn: first === undefined ? null : addDays(first, YEAR),
    shiftDays: written('count', YEAR, units),
  };
}

/** What is asked of the server. */
export function seasonCreateOf(values: NewSeason, from: ListedSeason | null): SeasonCreate {
  const { id, name, firstDay, lastDay, brewWeekdays, brewsPerDay } = values;
  const copy = from && { seasonId: from.id, ...wishOf(values) };
  return { id, name, firstDay, lastDay, brewWeekdays, brewsPerDay, copy };
}

type Wish = Pick<NewSeason, 'chainIds' | 'bench' | 'brewed' | 'by' | 'startOn' | 'shiftDays'>;

function wishOf({
  chainIds,
  bench,
  brewed,
  by,
  startOn,
  shiftDays,
}: Wish): Omit<SeasonCopy, 'seasonId'> {
  const dates = by === 'start' && startOn !== null ? { startOn } : { shiftDays: shiftDays ?? 0 };
  return { chainIds, bench, brewed, dates };
}

/** "2 shelves and 6 batches. The first brew day is Sat 4 March 2028, 52 weeks later." */
export function copyPreview(board: Board, wish: Wish & Pick<NewSeason, 'brewWeekdays'>): string {
  const { shelves, bench, shift } = copiedSeason(board, wishOf(wish), wish.brewWeekdays);
  const batches = [...shelves.flatMap((shelf) => shelf.batches), ...bench];
  const what = `${count(shelves.length, 'shelf', 'shelves')} and ${count(batches.length, 'batch', 'batches')}.`;
  const [first] = batches.flatMap(({ brewOn }) => (brewOn === null ? [] : [brewOn])).toSorted();
  if (first === undefined) return `${what} None of them has a brew day.`;
  return `${what} The first brew day is ${formatDay(first)} ${first.slice(0, 4)}, ${apart(shift)}.${moved(wish, first)}`;
}

function apart(days: number): string {
  if (days === 0) return 'on the same day as before';
  const size = Math.abs(days);
  const span = size % 7 === 0 ? count(size / 7, 'week') : count(size, 'day');
  return `${span} ${days > 0 ? 'later' : 'earlier'}`;
}

/** Where the brew days did not let it be as it was wished. */
function moved({ by, startOn }: Wish, first: string): string {
  if (by !== 'start' || startOn === null || daysBetween(startOn, first) === 0) return '';
  return ' It keeps to the brew days.';
}
