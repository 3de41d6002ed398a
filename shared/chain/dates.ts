import type { Batch } from '../api/batch.ts';
import type { ShiftedDate } from '../api/move.ts';
import type { Day } from '../rules/vocabulary.ts';
import { addDays, daysBetween, weekday } from '../units/day.ts';
import { indexBoard, isPencilled, sourceOf, type BoardFacts, type BoardIndex } from './board.ts';
import { draftOver, type Draft } from './draft.ts';

/** Racking day: the day that was read, else brew day + days under beer; null: not known. */
export function rackDay(batch: Pick<Batch, 'read' | 'brewOn' | 'daysUnderBeer'>): Day | null {
  if (batch.read.rackedOn !== null) return batch.read.rackedOn;
  if (batch.brewOn === null || batch.daysUnderBeer === null) return null;
  return addDays(batch.brewOn, batch.daysUnderBeer);
}

/** The day the yeast is taken from `earlier` for `later`: its own day, else at racking. */
export const takenDay = (earlier: Batch, later: Pick<Batch, 'link'>): Day | null =>
  later.link.takenOn ?? rackDay(earlier);

/** Further than this nobody plans; a season without any free day answers null. */
const LOOK_AHEAD_DAYS = 800;

/**
 * The next day from today on which the brewery can brew one more beer: a weekday it brews on, not
 * blocked, with fewer brews than its limit. Null where no such day comes.
 */
export function nextBrewDay(index: BoardIndex, exceptBatchId: string): Day | null {
  const { season, today } = index.board;
  const blocked = new Set(season.blockedDays);
  const brews = brewsByDay(index, exceptBatchId);
  for (let ahead = 0; ahead < LOOK_AHEAD_DAYS; ahead += 1) {
    const day = addDays(today, ahead);
    const free = (brews.get(day) ?? 0) < season.brewsPerDay;
    if (free && !blocked.has(day) && season.brewWeekdays.includes(weekday(day))) return day;
  }
  return null;
}

/** A batch that is brewed, or that is planned on a shelf: the bench only keeps wishes. */
export const isScheduled = (batch: Batch): boolean =>
  batch.stage !== 'scrapped' && (batch.chainId !== null || !isPencilled(batch));

function brewsByDay(index: BoardIndex, exceptBatchId: string): Map<Day, number> {
  const brews = new Map<Day, number>();
  for (const batch of index.board.batches)
    if (batch.brewOn !== null && batch.id !== exceptBatchId && isScheduled(batch))
      brews.set(batch.brewOn, (brews.get(batch.brewOn) ?? 0) + 1);
  return brews;
}

/**
 * Pulls pencilled batches along, from one place of a chain on: each is brewed on the day the yeast
 * before it is taken. Only what `follows` (its place changed) or stands behind a shifted date
 * moves; a batch that is fermenting or racked never does, nor does what stands behind it. Chains
 * that hang on a shifted batch come along.
 */
export function pullAlong(
  index: BoardIndex,
  draft: Draft,
  chainId: string,
  fromPlace: number,
  follows: (batchId: string) => boolean,
): void {
  const waiting = [{ chainId, place: fromPlace }];
  // A chain that hangs on itself can only come from damaged data; it must not turn for ever.
  for (let chains = 0; chains < waiting.length && chains < MOST_CHAINS; chains += 1) {
    const start = waiting[chains];
    if (!start) return;
    for (let place = start.place; ; place += 1) {
      const batch = draft.batchesOf(start.chainId)[place];
      if (!batch || !isPencilled(batch)) break;
      const before = beforePlace(draft, start.chainId, place);
      const follow = follows(batch.id);
      if (!follow && !(before && hasShifted(index, before))) break;
      const pulled = before ? pulledTo(index, batch, before, follow) : batch;
      if (pulled !== batch) draft.put(pulled);
      if (hasShifted(index, pulled))
        for (const branch of draft.branchesOf(batch.id))
          waiting.push({ chainId: branch.id, place: 0 });
    }
  }
}

const MOST_CHAINS = 1000;

const beforePlace = (draft: Draft, chainId: string, place: number): Batch | null =>
  place > 0 ? (draft.batchesOf(chainId)[place - 1] ?? null) : sourceOf(draft, draft.chain(chainId));

const hasShifted = (index: BoardIndex, batch: Batch): boolean =>
  index.batch(batch.id)?.brewOn !== batch.brewOn;

/**
 * The batch brewed on the day the yeast is taken from `before`. A day of taking that was planned
 * apart from racking shifts with the beer it is taken from.
 */
function pulledTo(index: BoardIndex, batch: Batch, before: Batch, newLink: boolean): Batch {
  const takenOn = newLink ? batch.link.takenOn : shiftedTaking(index, batch, before);
  const link = takenOn === batch.link.takenOn ? batch.link : { ...batch.link, takenOn };
  const brewOn = takenDay(before, { link }) ?? batch.brewOn;
  return brewOn === batch.brewOn && link === batch.link ? batch : { ...batch, brewOn, link };
}

function shiftedTaking(index: BoardIndex, batch: Batch, before: Batch): Day | null {
  const planned = index.batch(batch.id)?.link.takenOn ?? null;
  const from = index.batch(before.id)?.brewOn ?? null;
  if (planned === null || from === null || before.brewOn === null) return planned;
  return addDays(planned, daysBetween(from, before.brewOn));
}

/** Every pencilled batch of a chain brewed on the day the yeast before it is taken. */
export function pullChain(
  board: BoardFacts,
  chainId: string,
): { batches: Batch[]; shifted: ShiftedDate[] } {
  const index = indexBoard(board);
  const draft = draftOver(index);
  const poured = index.batchesOf(chainId).findLastIndex((batch) => !isPencilled(batch));
  const mates = new Set(index.batchesOf(chainId).map((batch) => batch.id));
  pullAlong(index, draft, chainId, poured + 1, (id) => mates.has(id));
  const batches = [...draft.rows.values()];
  return { batches, shifted: shiftedDates(index, batches) };
}

/** The dates that differ between the rows and the board. */
export function shiftedDates(index: BoardIndex, rows: readonly Batch[]): ShiftedDate[] {
  return rows.flatMap((row) => {
    const from = index.batch(row.id)?.brewOn ?? null;
    return from === row.brewOn ? [] : [{ batchId: row.id, from, to: row.brewOn }];
  });
}
