import { digestOf, type Observed } from '#shared/fermentation/digest.ts';
import type { Watched } from '#shared/fermentation/seen.ts';

const START = Date.parse('2027-03-20T10:00:00Z');
/** An instant so many hours after the start. */
export const hour = (hours: number): string => new Date(START + hours * 3_600_000).toISOString();

export const gravity = (hours: number, value: number): Observed => ({
  kind: 'gravity',
  at: hour(hours),
  value,
});
export const warmth = (hours: number, value: number): Observed => ({
  kind: 'temperature',
  at: hour(hours),
  value,
});

/** A pale ale of 1.050, expected to end at 1.012, on an ale yeast of 75 %. */
export function watched(
  readings: readonly Observed[],
  change: Partial<Watched> = {},
  pouredAt: string | null = hour(0),
): Watched {
  const followed = digestOf(readings, pouredAt);
  if (!followed) throw new Error('Give a reading');
  return {
    followed,
    og: 1.05,
    expectedFg: 1.012,
    plannedFg: 1.012,
    attenuation: 0.75,
    kind: 'ale',
    fermentMinC: 18,
    fermentMaxC: 22,
    cultures: [],
    ...change,
  };
}
