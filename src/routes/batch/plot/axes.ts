import type { Drawn } from './course.ts';

export interface Axis {
  low: number;
  high: number;
  ticks: number[];
}

/** A scale with round ticks over the values, at least `least` wide. */
export function axisOf(values: readonly number[], step: number, least: number): Axis {
  const low = Math.floor(lowest(values) / step + 1e-9) * step;
  const high = Math.max(Math.ceil(highest(values) / step - 1e-9) * step, low + least);
  const count = Math.round((high - low) / step);
  const every = Math.ceil(count / 6);
  const ticks = Array.from(
    { length: Math.floor(count / every) + 1 },
    (_, at) => low + at * every * step,
  );
  return { low, high, ticks };
}

const lowest = (values: readonly number[]) => values.reduce((a, b) => Math.min(a, b), Infinity);
const highest = (values: readonly number[]) => values.reduce((a, b) => Math.max(a, b), -Infinity);

const FOOT_SG = 0.005;

/** Null: no gravity is known, read or expected. */
export function gravityAxis({ gravity, band }: Drawn): Axis | null {
  const values = [
    ...gravity.map(({ value }) => value),
    ...band.flatMap(({ low, high }) => [low, high]),
  ];
  // Room under the lowest for the words of what was done.
  const foot = lowest(values) - FOOT_SG;
  return values.length === 0 ? null : axisOf([...values, foot], 0.01, 0.02);
}

export function temperatureAxis({ temperature, range }: Drawn): Axis | null {
  if (temperature.length === 0) return null;
  const values = temperature.map(({ value }) => value);
  return axisOf(range ? [...values, range.min - 2, range.max + 2] : values, 2, 6);
}

/** Whole days under the plot, at most eight or so. */
export function dayTicks(days: number, most: number): number[] {
  const every = [1, 2, 3, 5, 7, 14, 28, 56, 91, 182].find((step) => days / step <= most) ?? 365;
  return Array.from({ length: Math.floor(days / every) + 1 }, (_, at) => at * every);
}
