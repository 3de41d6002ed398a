import type { Batch } from '../api/batch.ts';
import type { TodayFacts } from '../api/today.ts';
import { indexBoard, type BoardFacts } from '../chain/board.ts';
import { rackDay } from '../chain/dates.ts';
import type { Day } from '../rules/vocabulary.ts';
import { addDays } from '../units/day.ts';
import { dayIn } from '../units/dayIn.ts';
import { DUTY_KINDS, type Duty } from './duty.ts';
import { hopDuties } from './hops.ts';
import { successorsOf, type Sight } from './sight.ts';

/**
 * A fermenting beer is read at least so often: common practice of small breweries, no published
 * number. The end is another matter: there two readings 48 h apart are asked for by the pour check.
 */
export const READING_EVERY_DAYS = 3;

/**
 * Everything that is to be done, whenever: by day, and within a day by its kind. Days are the
 * brewery's own.
 */
export function dutiesOf(board: BoardFacts, facts: TodayFacts, timeZone: string): Duty[] {
  const sight: Sight = { index: indexBoard(board), facts, timeZone };
  const standing = board.batches.filter(({ stage }) => stage !== 'scrapped');
  const duties = [
    ...standing.flatMap((batch) => dutiesOfBatch(batch, sight)),
    ...asked(sight),
    ...jars(sight),
  ];
  return duties.toSorted(
    (a, b) =>
      order(a.day, b.day) ||
      DUTY_KINDS.indexOf(a.kind) - DUTY_KINDS.indexOf(b.kind) ||
      order(a.key, b.key),
  );
}

const order = (a: string, b: string) => (a < b ? -1 : a > b ? 1 : 0);

function dutiesOfBatch(batch: Batch, sight: Sight): Duty[] {
  switch (batch.stage) {
    case 'pencilled':
      return brew(batch, sight);
    case 'fermenting':
      return [
        ...rack(batch),
        ...hopDuties(batch, sight),
        ...read(batch, sight),
        ...events(batch, sight),
      ];
    case 'racked':
      return check(batch, sight);
    case 'scrapped':
      return [];
  }
}

/** A pour in hand stands in the place of its brew day. */
function brew(batch: Batch, { index, facts }: Sight): Duty[] {
  const isInHand = facts.runs.some(({ batchId }) => batchId === batch.id);
  if (batch.chainId === null || batch.brewOn === null || isInHand) return [];
  const onto = index.predecessor(batch.id);
  const due = { key: `brew ${batch.id}`, batchId: batch.id, day: batch.brewOn };
  return [{ ...due, kind: 'brew', ontoId: onto?.id ?? null }];
}

function rack(batch: Batch): Duty[] {
  const day = rackDay(batch);
  return day === null ? [] : [{ kind: 'rack', key: `rack ${batch.id}`, batchId: batch.id, day }];
}

/** From its brew day on, or from the day of the last reading. */
function read(batch: Batch, { timeZone }: Sight): Duty[] {
  const lastAt = batch.followed?.lastAt;
  const lastOn = lastAt === undefined ? null : dayIn(timeZone, new Date(lastAt));
  const from = lastOn ?? batch.brewOn;
  if (from === null) return [];
  const day = addDays(from, READING_EVERY_DAYS);
  return [{ kind: 'reading', key: `reading ${batch.id}`, batchId: batch.id, day, lastOn }];
}

/** What else was planned for a batch; hops and yeast have their own. */
const events = (batch: Batch, { facts }: Sight): Duty[] =>
  facts.events.flatMap(({ id, batchId, kind, plannedOn, isDone, text }) =>
    batchId !== batch.id ||
    isDone ||
    plannedOn === null ||
    !(kind === 'addition' || kind === 'other')
      ? []
      : [{ kind: 'event', key: `event ${id}`, batchId, day: plannedOn, text }],
  );

/** A bare cake that somebody waits for is judged on the day that its beer is racked. */
function check(batch: Batch, { index }: Sight): Duty[] {
  const { rackedOn } = batch.read;
  const later = successorsOf(batch, index)[0];
  const isOpen = batch.cake?.state === 'bare' && batch.cake.check === null;
  if (!isOpen || rackedOn === null || !later) return [];
  const due = { key: `check ${batch.id}`, batchId: batch.id, day: rackedOn };
  return [{ ...due, kind: 'cake-check', forId: later.id }];
}

/** What waits for an answer is due from the day on which it arose. */
function asked({ facts, timeZone, index }: Sight): Duty[] {
  const on = (instant: string): Day => dayIn(timeZone, new Date(instant));
  const isHere = ({ batchId }: { batchId: string }) => index.batch(batchId) !== undefined;
  return [
    ...facts.overrides.filter(isHere).map((one) => ({
      ...one,
      kind: 'override' as const,
      key: `override ${one.id}`,
      day: on(one.askedAt),
    })),
    ...facts.runs.filter(isHere).map(({ batchId, heldBy, openedAt }) => ({
      kind: 'pour-open' as const,
      key: `run ${batchId}`,
      batchId,
      heldBy,
      day: on(openedAt),
    })),
    ...facts.unsigned.filter(isHere).map(({ batchId, at }) => ({
      kind: 'signature' as const,
      key: `signature ${batchId}`,
      batchId,
      day: on(at),
    })),
  ];
}

const jars = ({ facts, index }: Sight): Duty[] =>
  facts.jars
    .filter(({ batchId }) => index.batch(batchId) !== undefined)
    .map(({ id, ...jar }) => ({ ...jar, kind: 'jar', key: `jar ${id}` }));
