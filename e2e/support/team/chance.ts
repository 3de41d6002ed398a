/** Choices that one seed makes again. */
export interface Chance {
  /** From 0 to below 1. */
  next(): number;
  /** A whole number from 0 to below `count`. */
  below(count: number): number;
  pick<T>(from: readonly T[]): T | undefined;
}

/** Mulberry32, a generator in the public domain: plenty for choosing who does what. */
export function createChance(seed: number): Chance {
  let state = seed >>> 0;
  const next = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
  const below = (count: number) => Math.floor(next() * count);
  return { next, below, pick: (from) => from[below(from.length)] };
}
