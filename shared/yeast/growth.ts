import { apparentExtract, platoFromSg } from '../units/gravity.ts';

/**
 * New cells per mL and °P of apparent drop. Between the still starters of White & Zainasheff 2010
 * (7.4e6, citing Nielsen 2005) and the 80e6/mL peak of Boulton & Quain 2001.
 */
export const YIELD_PER_ML_PLATO = 7e6;

/**
 * Share of that yield by original gravity, °P: stronger worts give smaller crops (direction:
 * Suihko, Vilpola & Linko 1993, J. Inst. Brew. 99; the numbers are our judgement).
 */
const TAPER = [
  [16, 1],
  [18, 0.85],
  [22, 0.7],
  [25, 0.6],
] as const;

/** Share of the full yield, 0.6–1, at an original gravity in °P; linear between the points. */
export function yieldShare(plato: number): number {
  let [fromP, fromShare]: readonly [number, number] = TAPER[0];
  if (plato <= fromP) return fromShare;
  for (const [toP, toShare] of TAPER) {
    if (plato <= toP) return fromShare + ((toShare - fromShare) * (plato - fromP)) / (toP - fromP);
    [fromP, fromShare] = [toP, toShare];
  }
  return fromShare;
}

/** Cells grown per mL of beer fermented from og to fg (SG); 0 where nothing fermented. */
export function growthPerMl(og: number, fg: number): number {
  const plato = platoFromSg(og);
  const drop = Math.max(0, plato - apparentExtract(fg));
  return YIELD_PER_ML_PLATO * yieldShare(plato) * drop;
}
