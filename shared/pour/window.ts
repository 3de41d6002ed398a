import type { YeastFacts } from '../rules/facts.ts';

/**
 * Where a yeast that names no window of its own is poured (common practice; an ale of Shardlow 1972
 * was pitched at 18.9 °C). The yeast maker's own range goes first.
 */
const USUAL_WINDOW = { ale: { minC: 18, maxC: 22 }, lager: { minC: 10, maxC: 14 } } as const;

/**
 * Growth ends at 37 °C and more for ale yeast, at 34 °C for lager yeast: Handbook of Brewing, 3rd ed.,
 * yeast chapter. Warm-fermenting farmhouse yeasts have their own.
 */
const USUAL_NEVER_ABOVE = { ale: 38, lager: 35 } as const;

export interface PourWindow {
  minC: number;
  maxC: number;
  /** The yeast's own range, not the usual one of its kind. */
  own: boolean;
}

type Known = Pick<YeastFacts, 'kind' | 'pourMinC' | 'pourMaxC' | 'neverAboveC'>;

/** The temperatures at which wort may go onto this yeast, °C, both ends included. */
export function pourWindow({ kind, pourMinC, pourMaxC }: Known): PourWindow {
  return pourMinC === undefined || pourMaxC === undefined
    ? { ...USUAL_WINDOW[kind], own: false }
    : { minC: pourMinC, maxC: pourMaxC, own: true };
}

/** The temperature at and above which wort kills this yeast, °C. */
export function neverAbove({ kind, neverAboveC }: Known): { c: number; own: boolean } {
  return neverAboveC === undefined
    ? { c: USUAL_NEVER_ABOVE[kind], own: false }
    : { c: neverAboveC, own: true };
}
