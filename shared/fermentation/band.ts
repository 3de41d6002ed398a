import type { YeastKind } from '../rules/vocabulary.ts';

/** Expected gravity at a time after the pour, SG. */
export interface BandPoint {
  day: number;
  low: number;
  high: number;
}

/**
 * Half of the fall is done after `half` days, and `rate` a day says how steep the middle is: the
 * quickest and the slowest that are usual (common practice).
 */
const PACE: Record<YeastKind, Record<'quick' | 'slow', { half: number; rate: number }>> = {
  ale: { quick: { half: 1.2, rate: 2.4 }, slow: { half: 3.5, rate: 1.3 } },
  lager: { quick: { half: 3, rate: 1.1 }, slow: { half: 7, rate: 0.65 } },
};
/** An original and a final gravity may be off by so much and nothing is wrong (common practice). */
const OG_EITHER_WAY = 0.002;
const FG_EITHER_WAY = 0.003;

export const BAND_BASIS =
  'The band is a guide, not a limit: a logistic course (Speers and others 2003, J. Inst. Brew. 109:229, from memory) from the original gravity to the expected final one ± 0.003, half way after 1 to 3½ days for an ale and 3 to 7 for a lager (common practice).';

/**
 * Where the gravity is usually found, from the pour (day 0) to the last day asked for.
 * @param og original gravity, SG.
 * @param fg expected final gravity, SG.
 */
export function expectedBand(
  og: number,
  fg: number,
  kind: YeastKind,
  days: number,
  steps = 56,
): BandPoint[] {
  const { quick, slow } = PACE[kind];
  return Array.from({ length: steps + 1 }, (_, at) => {
    const day = (at * days) / steps;
    return {
      day,
      low: course(day, og - OG_EITHER_WAY, fg - FG_EITHER_WAY, quick),
      high: course(day, og + OG_EITHER_WAY, fg + FG_EITHER_WAY, slow),
    };
  });
}

/** A logistic fall that starts at `from` on day 0. */
function course(
  day: number,
  from: number,
  to: number,
  { half, rate }: { half: number; rate: number },
): number {
  const left = (at: number) => 1 / (1 + Math.exp(rate * (at - half)));
  return to + ((from - to) * left(day)) / left(0);
}
