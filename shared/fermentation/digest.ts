import type { Followed } from '../api/batch.ts';

export interface Observed {
  kind: 'gravity' | 'temperature' | 'ph';
  /** Instant, ISO 8601 in UTC. */
  at: string;
  /** SG, °C or pH, corrected. */
  value: number;
}

/** Two gravities no further apart than this are the same: what a hydrometer can be read to. */
export const SAME_SG = 0.001;
/** A fall of this much is seen for certain: two readings, each to 0.001 (common practice). */
export const BEGUN_SG = 0.002;

/** Whole ten-thousandths, so that 1.012 and 1.011 are 0.001 apart whatever the machine's digits. */
export const tenThousandths = (sg: number): number => Math.round(sg * 10_000);

const isApart = (a: number, b: number, by: number) =>
  Math.abs(tenThousandths(a) - tenThousandths(b)) > tenThousandths(by);

/**
 * What a batch's readings come to; null without any. SG, °C.
 * @param readings in order of time.
 * @param pouredAt when the wort met its yeast, where that was recorded.
 */
export function digestOf(readings: readonly Observed[], pouredAt: string | null): Followed | null {
  const last = readings.at(-1);
  if (!last) return null;
  const gravities = readings.filter(({ kind }) => kind === 'gravity');
  const warmth = readings.findLast(({ kind }) => kind === 'temperature');
  const [first] = gravities;
  const newest = gravities.at(-1);
  const begun = first && gravities.findIndex((each) => hasFallen(first.value, each.value));
  return {
    count: readings.length,
    lastAt: last.at,
    pouredAt,
    firstGravity: first?.value ?? null,
    firstGravityAt: first?.at ?? null,
    gravity: newest?.value ?? null,
    gravityAt: newest?.at ?? null,
    steadyFrom: steadyFrom(gravities),
    lowest: newest ? lowestOf(gravities) : null,
    begunAt: begun === undefined || begun < 0 ? null : (gravities[begun]?.at ?? null),
    stillAt: begun === undefined ? null : (gravities.at(begun < 0 ? -1 : begun - 1)?.at ?? null),
    temperatureC: warmth?.value ?? null,
    temperatureAt: warmth?.at ?? null,
  };
}

/** True where a gravity stands clearly below another. */
export const hasFallen = (from: number, to: number): boolean =>
  tenThousandths(from) - tenThousandths(to) >= tenThousandths(BEGUN_SG);

const lowestOf = (gravities: readonly Observed[]): number =>
  gravities.reduce((low, { value }) => Math.min(low, value), Infinity);

function steadyFrom(gravities: readonly Observed[]): string | null {
  const newest = gravities.at(-1);
  if (!newest) return null;
  const moved = gravities.findLastIndex(({ value }) => isApart(value, newest.value, SAME_SG));
  return gravities[moved + 1]?.at ?? null;
}
