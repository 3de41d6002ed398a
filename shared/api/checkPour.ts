import { z } from 'zod';
import { POUR_RULES } from '../pour/vocabulary.ts';
import { VERDICTS, YEAST_KINDS } from '../rules/vocabulary.ts';
import { maybe, orderedHouseRules } from './check.ts';
import * as f from './fields.ts';
import { alsoWhenFaulty, bothEnds } from './refining.ts';

/** `POST /api/check/pour`. A key that is absent is unknown, and so is a null. */

/** A moment, with its distance from UTC. */
const moment = z.iso.datetime({ offset: true, error: 'Write it as 2027-04-03T15:30:00Z' });

const yeast = bothEnds(
  z.strictObject({
    kind: z.enum(YEAST_KINDS),
    pourMinC: maybe(f.celsius),
    pourMaxC: maybe(f.celsius),
    neverAboveC: maybe(f.celsius),
  }),
  'pourMinC',
  'pourMaxC',
);

/** More than anybody takes on a brew day, one every minute. */
const MOST_READINGS = 1000;

const readings = z
  .array(z.strictObject({ at: moment, c: f.celsius }))
  .max(MOST_READINGS, `At most ${MOST_READINGS} readings`);

const whole = z.strictObject({
  yeast,
  /** The moment that is judged. */
  at: moment,
  wort: maybe(z.strictObject({ volumeL: maybe(f.volumeL), og: maybe(f.originalGravity) })),
  cake: maybe(z.strictObject({ volumeL: maybe(f.partL), c: maybe(f.celsius) })),
  /** Temperature of the cooling water, or of the room. */
  coolantC: maybe(f.celsius),
  houseRules: maybe(orderedHouseRules()),
  /** In any order. */
  readings,
});

/** Where a reading is later than the moment that is judged; null: nowhere. */
const laterThan = (at: unknown, given: unknown): number | null => {
  const limit = typeof at === 'string' ? Date.parse(at) : Number.NaN;
  if (Number.isNaN(limit) || !Array.isArray(given)) return null;
  const found = given.findIndex((one: unknown) => {
    const when = one && typeof one === 'object' && 'at' in one ? one.at : null;
    return typeof when === 'string' && Date.parse(when) > limit;
  });
  return found === -1 ? null : found;
};

export const checkPourRequest = alsoWhenFaulty(
  whole,
  ['readings'],
  'A reading cannot be later than the moment that is judged',
  (value) => laterThan(value.at, value.readings) === null,
);
export type CheckPourRequest = z.infer<typeof checkPourRequest>;

export const pourFinding = z.strictObject({
  rule: z.enum(POUR_RULES),
  verdict: z.enum(['mind', 'hold']),
  title: z.string(),
  because: z.string(),
  do: z.string(),
  measures: z.array(
    z.strictObject({
      label: z.string(),
      value: z.number(),
      unit: z.string(),
      limit: z.number().nullable(),
    }),
  ),
  basis: z.string(),
});

const at = z.iso.datetime();

export const checkPourAnswer = z.strictObject({
  verdict: z.enum(VERDICTS),
  findings: z.array(pourFinding),
  window: z.strictObject({ minC: z.number(), maxC: z.number() }),
  readingC: z.number().nullable(),
  mixedC: z.number().nullable(),
  overridable: z.boolean(),
  /** earliest and latest bound the 90 % interval. */
  ready: z.strictObject({ at, earliest: at, latest: at }).nullable(),
  whyNotReady: z.string().nullable(),
});
export type CheckPourAnswer = z.infer<typeof checkPourAnswer>;
