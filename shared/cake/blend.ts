/** What the beer that stays with the cake does to the next one. Mass balance by volume. */

export interface KeptCake {
  /** Part of the cake that is kept, litres; more than there is counts as all of it. */
  keptL: number;
  /** The whole cake, litres. */
  cakeL: number;
  /** Beer left above the whole cake, litres. */
  leftAboveL: number;
}

/** Half of a settled cake is the beer between its cells (40–60 % spun solids are quoted). */
export const BEER_IN_CAKE = 0.5;

/** Beer that goes over with the kept part, litres. */
export function retainedBeerL({ keptL, cakeL, leftAboveL }: KeptCake): number {
  if (cakeL <= 0) return 0;
  const kept = Math.min(Math.max(keptL, 0), cakeL);
  return BEER_IN_CAKE * kept + (leftAboveL * kept) / cakeL;
}

/**
 * Figure of the later beer after `vR` litres of the earlier one went into its `vB` litres: SRM, IBU
 * and gravity all mix by volume. Nothing poured at all gives the later beer's own figure.
 */
export const blend = (vB: number, xB: number, vR: number, xA: number): number =>
  vB + vR > 0 ? (vB * xB + vR * xA) / (vB + vR) : xB;
