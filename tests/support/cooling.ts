/** Coolings made by Newton's law itself, not by the code that is tested. */

/** Numbers from 0 to 1 that a seed decides (mulberry32, in the public domain). */
export function chance(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** A normal number of mean 0 and deviation 1 (Box and Muller 1958). */
export const normal = (next: () => number): number =>
  Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next());

export interface Cooling {
  from: number;
  towards: number;
  /** Time constant, minutes. */
  tau: number;
}

export const START = Date.UTC(2027, 3, 3, 15);
export const minutes = (count: number): number => START + count * 60_000;

export const trueC = ({ from, towards, tau }: Cooling, t: number): number =>
  towards + (from - towards) * Math.exp(-t / tau);

/** Minutes until the wort is at `c`. */
export const trueTime = ({ from, towards, tau }: Cooling, c: number): number =>
  tau * Math.log((from - towards) / (c - towards));

/** Readings every so many minutes with an error of 0.3 °C, as a thermometer shows them. */
export const read = (cooling: Cooling, next: () => number, every: number, count: number) =>
  Array.from({ length: count }, (_, n) => ({
    at: minutes(n * every),
    c: Math.round((trueC(cooling, n * every) + 0.3 * normal(next)) * 10) / 10,
  }));
