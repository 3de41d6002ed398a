import type { PourAnswer } from '#shared/pour/check.ts';
import type { Reading } from '#shared/pour/forecast.ts';

/** Sizes of the plot, in its own units. */
export const PLOT = { width: 354, height: 190, left: 30, right: 344, top: 12, floor: 156 } as const;

const MINUTE = 60_000;
const LEAST_SPAN = 20 * MINUTE;
/** A forecast of tomorrow would press the readings into a line. */
const MOST_AHEAD = 6 * 60 * MINUTE;

export interface Plot {
  x: (at: number) => number;
  y: (c: number) => number;
  from: number;
  to: number;
  /** Temperatures that are written at the side, °C. */
  marks: number[];
  /** The forecast from now, as points of a line. */
  ahead: [number, number][];
}

/** Where everything stands: all readings, the window, the forecast as far as it reaches. */
export function plotOf(
  readings: readonly Reading[],
  { window: pourWindow, ready, ahead }: Pick<PourAnswer, 'window' | 'ready' | 'ahead'>,
  now: number,
  marks: (low: number, high: number) => number[],
): Plot {
  const first = readings[0]?.at ?? now;
  const last = readings.at(-1)?.at ?? now;
  const reach = ready ? Math.min(ready.latest, last + MOST_AHEAD) : now;
  const from = first;
  const to = Math.max(now, reach, first + LEAST_SPAN) + 0.06 * (Math.max(now, reach) - first);
  const cs = [...readings.map(({ c }) => c), pourWindow.minC - 3, pourWindow.maxC + 3];
  const [low, high] = [Math.min(...cs), Math.max(...cs)];
  const x = scale(from, to, PLOT.left, PLOT.right);
  const y = scale(low, high, PLOT.floor, PLOT.top);
  return { x, y, from, to, marks: marks(low, high), ahead: line(ahead, last, to) };
}

const scale = (from: number, to: number, low: number, high: number) => (value: number) =>
  low + ((value - from) / (to - from || 1)) * (high - low);

const STEPS = 40;

function line(ahead: PourAnswer['ahead'], from: number, to: number): [number, number][] {
  if (!ahead || to <= from) return [];
  return Array.from({ length: STEPS + 1 }, (_, n): [number, number] => {
    const at = from + (n / STEPS) * (to - from);
    return [at, ahead(at)];
  });
}

/** Round numbers between two ends, in the unit that is shown: five or so. */
export function roundMarks(low: number, high: number): number[] {
  const step = [1, 2, 5, 10, 20, 50].find((each) => (high - low) / each <= 6) ?? 100;
  const first = Math.ceil(low / step) * step;
  return Array.from({ length: Math.floor((high - first) / step) + 1 }, (_, n) => first + n * step);
}
