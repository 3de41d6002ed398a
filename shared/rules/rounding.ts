/**
 * Rounding before comparing. Facts are rounded to the digits that a brewer can read off; computed
 * shares only lose the noise of floating point, so that 0.20 of a volume is 0.20 in any unit.
 */
export const toTenth = (value: number): number => Math.round(value * 10) / 10;
export const toHundredth = (value: number): number => Math.round(value * 100) / 100;
export const withoutNoise = (value: number): number => Math.round(value * 1e9) / 1e9;

/** 15 °P and 18 °P, compared as SG. */
export const SG_15_PLATO = 1.061;
export const SG_18_PLATO = 1.074;
