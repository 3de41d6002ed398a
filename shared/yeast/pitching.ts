import type { YeastKind } from '../rules/vocabulary.ts';
import { platoFromSg, points } from '../units/gravity.ts';

/**
 * Viable cells per mL and °P: Fix, *Analysis of Brewing Techniques* 1997, as quoted in the trade
 * (suppliers publish 0.75–1.5e6 by strain).
 */
export const CELLS_PER_ML_PLATO: Readonly<Record<YeastKind, number>> = {
  ale: 0.75e6,
  lager: 1.5e6,
};

/** A quarter more from 18 °P (1.074), after the step from 2.3 to 2.9e6 of Suihko et al. 1993. */
const STRONG_FROM_POINTS = 74;
export const STRONG_SHARE = 1.25;

/** What is known of a wort that yeast is to be pitched into: litres, SG, kind of yeast. */
export interface Wort {
  volumeL: number;
  og: number;
  kind: YeastKind;
}

/** Viable cells that a wort needs. */
export function pitchNeed({ volumeL, og, kind }: Wort): number {
  const strong = points(og) >= STRONG_FROM_POINTS ? STRONG_SHARE : 1;
  return CELLS_PER_ML_PLATO[kind] * strong * platoFromSg(og) * volumeL * 1000;
}
