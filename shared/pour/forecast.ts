import { SAY_DEFAULT, type Say } from '../rules/say.ts';
import {
  bestCurve,
  meeting,
  onCurve,
  READING_ERROR_C,
  type Curve,
  type Point,
  type Towards,
} from './coolingFit.ts';

/** Milliseconds since 1970, and °C. */
export interface Reading {
  at: number;
  c: number;
}

export interface Ready {
  at: number;
  earliest: number;
  latest: number;
}

/** The temperature of the wort from the last reading on, °C, as the best curve has it. */
export type Ahead = (at: number) => number;

export interface Forecast {
  /** When the wort comes into the window; null: it is inside, or `whyNot` says why not. */
  ready: Ready | null;
  whyNot: string | null;
  ahead: Ahead | null;
}

export interface ForecastOf {
  /** In any order. */
  readings: readonly Reading[];
  window: { minC: number; maxC: number };
  /** Temperature of the cooling water, or of the room, °C: the wort gets no colder. */
  coolantC?: number | undefined;
}

const MINUTE = 60_000;
/** No brewery cools towards less, nor warms a wort towards more, °C. */
const COLDEST = -5;
const WARMEST = 110;
/** One-sided 95 % point of the normal distribution. */
const SURELY = 1.645;
/** 99.9 % points of chi-square, by degrees of freedom: readings worse than this follow no one curve. */
const NO_ONE_CURVE = [10.8, 13.8, 16.3, 18.5, 20.5, 22.5, 24.3, 26.1, 27.9, 29.6];
/** Readings beyond these tell nothing more of where the curve leads. */
const MOST_READINGS = 60;

const nothing = (whyNot: string | null, ahead: Ahead | null = null): Forecast => ({
  ready: null,
  whyNot,
  ahead,
});

/**
 * When will the wort be in its window? Newton's law of cooling fitted to the readings, each with an
 * error of 0.3 °C, and the 90 % interval of the time; or in one sentence why it cannot be said. Three
 * readings leave the surroundings free (not below a known coolant); two need the coolant.
 */
export function forecast(of: ForecastOf, say: Say = SAY_DEFAULT): Forecast {
  const readings = inOrder(of.readings);
  const last = readings.at(-1);
  if (!last) return nothing('Take a first reading.');
  const { minC, maxC } = of.window;
  if (last.c >= minC && last.c <= maxC) return nothing(null);
  return last.c > maxC ? cooling(readings, maxC, of.coolantC, say) : warming(readings, minC, say);
}

/** By time; of readings at one instant the last that was given. */
function inOrder(readings: readonly Reading[]): Reading[] {
  const at = new Map(readings.map((reading) => [reading.at, reading]));
  return [...at.values()].sort((a, b) => a.at - b.at).slice(-MOST_READINGS);
}

const pointsOf = (readings: readonly Reading[], sign: 1 | -1): Point[] => {
  const start = readings[0]?.at ?? 0;
  return readings.map(({ at, c }) => ({ t: (at - start) / MINUTE, c: sign * c }));
};

function cooling(
  readings: readonly Reading[],
  maxC: number,
  coolantC: number | undefined,
  say: Say,
): Forecast {
  if (coolantC !== undefined && coolantC >= maxC)
    return nothing(
      `It cools towards ${say.temperature(coolantC)}, which is not below ${say.temperature(maxC)}: use something colder.`,
    );
  if (readings.length < 2) return nothing('Take another reading in a few minutes for a forecast.');
  if (readings.length < 3 && coolantC === undefined)
    return nothing(
      'Two readings are too few for a forecast: take a third, or give the temperature of the cooling water or room.',
    );
  const low = coolantC ?? COLDEST;
  const towards = readings.length < 3 ? { low, high: low } : { low, high: WARMEST };
  return along(readings, maxC, 1, towards, {
    away: 'The wort is getting warmer, not colder: it will not come into the window like this.',
    still: (c) =>
      `The wort levels off near ${say.temperature(c)}, above the window: it needs something colder around it.`,
    unsure:
      'The readings cannot yet tell when it will be ready, or whether it levels off above the window: take another in some minutes.',
  });
}

function warming(readings: readonly Reading[], minC: number, say: Say): Forecast {
  if (readings.length < 3)
    return nothing('It is below the window: with three readings there is a forecast.');
  // Mirrored at zero, a wort that warms is one that cools.
  return along(
    readings,
    -minC,
    -1,
    { low: -WARMEST, high: WARMEST },
    {
      away: 'The wort is below the window and still getting colder: warm it, or stop cooling.',
      still: (c) =>
        `The wort levels off near ${say.temperature(c)}, below the window: it needs something warmer around it.`,
      unsure:
        'The readings cannot yet tell when it will be ready, or whether it levels off below the window: take another in some minutes.',
    },
  );
}

interface Words {
  away: string;
  still: (celsius: number) => string;
  unsure: string;
}

function along(
  readings: readonly Reading[],
  target: number,
  sign: 1 | -1,
  towards: Towards,
  words: Words,
): Forecast {
  const { points, curve, start } = ofOneCurve(readings, sign, towards);
  const ahead: Ahead = (at) => sign * onCurve(curve, (at - start) / MINUTE);
  if (points.length > 1 && slope(points) > SURELY * slopeError(points))
    return nothing(words.away, ahead);
  const towardsTarget = { low: towards.low, high: Math.min(towards.high, target - 0.01) };
  const met = meeting(points, target, towardsTarget);
  if (met.misfit - curve.misfit > SURELY ** 2) return nothing(words.still(sign * curve.s), ahead);
  if (met.high === null) return nothing(words.unsure, ahead);
  const at = (minutes: number) => start + Math.round(minutes * MINUTE);
  return {
    ready: { at: at(met.likely), earliest: at(met.low), latest: at(met.high) },
    whyNot: null,
    ahead,
  };
}

/**
 * The readings that follow one curve: where a chiller was turned on or the vessel moved, the old ones
 * are left out, the oldest first, as long as three are left.
 */
function ofOneCurve(readings: readonly Reading[], sign: 1 | -1, towards: Towards) {
  for (let from = 0; ; from += 1) {
    const kept = readings.slice(from);
    const points = pointsOf(kept, sign);
    const curve: Curve = bestCurve(points, towards);
    const freedom = points.length - 3;
    // Once something changed, what is kept must follow its curve well, not only not badly.
    const worst = NO_ONE_CURVE[freedom - 1] ?? freedom + 3.1 * Math.sqrt(2 * freedom) + 5;
    const most = from === 0 ? worst : freedom + 1;
    if (freedom < 1 || curve.misfit <= most) return { points, curve, start: kept[0]?.at ?? 0 };
  }
}

const spreadOf = (points: readonly Point[]) => {
  const mean = points.reduce((sum, { t }) => sum + t, 0) / points.length;
  return { mean, squares: points.reduce((sum, { t }) => sum + (t - mean) ** 2, 0) };
};

function slope(points: readonly Point[]): number {
  const { mean, squares } = spreadOf(points);
  return points.reduce((sum, { t, c }) => sum + (t - mean) * c, 0) / squares;
}

const slopeError = (points: readonly Point[]): number =>
  READING_ERROR_C / Math.sqrt(spreadOf(points).squares);
