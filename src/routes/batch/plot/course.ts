import type { BatchRecord, Reading } from '#shared/api/reading.ts';
import type { Batch } from '#shared/api/batch.ts';
import { expectedBand, type BandPoint } from '#shared/fermentation/band.ts';
import { noticesOf, watchedOf } from '#shared/fermentation/notices.ts';
import { expectedFinal } from '#shared/fermentation/attenuation.ts';
import { rangeOf } from '#shared/fermentation/warmth.ts';
import type { Yeast } from '#shared/api/yeast.ts';
import { fromLocal } from '../../../app/zonedTime.ts';

const MS_PER_DAY = 86_400_000;

/** A value at a day after the start. */
export interface Point {
  day: number;
  value: number;
}

export interface Mark {
  day: number;
  words: string;
  kind: 'pour' | 'rack' | 'event' | 'today';
}

/** All that is drawn of a fermentation, in days from its start. */
export interface Drawn {
  /** Instant of day 0, ms. */
  start: number;
  days: number;
  gravity: Point[];
  temperature: Point[];
  band: BandPoint[];
  range: { min: number; max: number } | null;
  marks: Mark[];
}

export interface DrawnOf {
  batch: Batch;
  record: BatchRecord;
  yeast: Yeast | undefined;
  timeZone: string;
  now: number;
}

/** Null: there is nothing to draw. Day 0 is the pour, else the brew day's noon, else the first reading. */
export function drawnOf({ batch, record, yeast, timeZone, now }: DrawnOf): Drawn | null {
  const start = startOf(batch, record, timeZone);
  if (start === null) return null;
  const dayAt = (iso: string) => (Date.parse(iso) - start) / MS_PER_DAY;
  const last = record.readings.at(-1);
  const racked = noon(batch.read.rackedOn, timeZone);
  const end = racked ?? Math.max(now, last ? Date.parse(last.takenAt) : 0);
  const planned = batch.stage === 'fermenting' ? (batch.daysUnderBeer ?? 0) : 0;
  const days = Math.max(7, Math.min(planned, 28), Math.ceil((end - start) / MS_PER_DAY));
  return {
    start,
    days,
    gravity: pointsOf(record.readings, 'gravity', dayAt),
    temperature: pointsOf(record.readings, 'temperature', dayAt),
    band: bandOf(batch, yeast, days),
    range: yeast ? rangeOf(yeast) : null,
    marks: marksOf(batch, record, { dayAt, racked, now, start, days, timeZone }),
  };
}

function startOf(batch: Batch, { pouredAt, readings }: BatchRecord, timeZone: string) {
  if (pouredAt !== null) return Date.parse(pouredAt);
  const first = readings[0] ? Date.parse(readings[0].takenAt) : null;
  const brewed = noon(batch.brewOn, timeZone);
  if (first === null || brewed === null) return first ?? brewed;
  return Math.min(first, brewed);
}

const noon = (day: string | null, timeZone: string): number | null => {
  const at = day === null ? null : fromLocal(`${day}T12:00`, timeZone);
  return at === null ? null : Date.parse(at);
};

const pointsOf = (
  readings: readonly Reading[],
  kind: Reading['kind'],
  dayAt: (iso: string) => number,
): Point[] =>
  readings.flatMap((one) =>
    one.kind === kind ? [{ day: dayAt(one.takenAt), value: one.value }] : [],
  );

function bandOf(batch: Batch, yeast: Yeast | undefined, days: number): BandPoint[] {
  const og = batch.read.og ?? batch.og;
  const fg = expectedFinal(og, batch.fg, yeast?.attenuation ?? null);
  return og === null || fg === null || !yeast ? [] : expectedBand(og, fg, yeast.kind, days);
}

interface When {
  dayAt: (iso: string) => number;
  racked: number | null;
  now: number;
  start: number;
  days: number;
  timeZone: string;
}

function marksOf(batch: Batch, record: BatchRecord, when: When): Mark[] {
  const { dayAt, racked, now, start, days } = when;
  const dayOf = (at: number) => (at - start) / MS_PER_DAY;
  const marks: Mark[] = record.events.flatMap(({ kind, doneAt, text }) =>
    doneAt === null ? [] : [{ day: dayAt(doneAt), words: eventWords(kind, text), kind: 'event' }],
  );
  if (record.pouredAt !== null)
    marks.push({ day: dayAt(record.pouredAt), words: 'poured', kind: 'pour' });
  if (racked !== null) marks.push({ day: dayOf(racked), words: 'racked', kind: 'rack' });
  else if (batch.stage === 'fermenting')
    marks.push({ day: dayOf(now), words: 'now', kind: 'today' });
  return marks.filter(({ day }) => day >= 0 && day <= days + 0.01);
}

const EVENTS = {
  'dry-hop': 'dry hops in',
  addition: 'added',
  'yeast-taken': 'yeast taken',
  other: '',
};

const eventWords = (kind: keyof typeof EVENTS, text: string): string =>
  [EVENTS[kind], text].filter(Boolean).join(', ');

/** What the readings warn of, in the reader's units. */
export const warningsOf = (
  batch: Batch,
  yeast: Yeast | undefined,
  say: Parameters<typeof noticesOf>[1],
) => {
  const watched = yeast ? watchedOf(batch, yeast) : null;
  return watched ? noticesOf(watched, say) : [];
};
