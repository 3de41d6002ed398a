/** Apparent attenuation, share: how much of the gravity above 1 is gone. A wort of 1 has none. */
export const apparentAttenuation = (og: number, sg: number): number =>
  og <= 1 ? 0 : (og - sg) / (og - 1);

/** The gravity that a share of apparent attenuation leaves, SG. */
export const gravityAt = (og: number, attenuation: number): number =>
  1 + (og - 1) * (1 - attenuation);

/**
 * Where the gravity is expected to end, SG: as planned, else by the yeast's own attenuation; null
 * where neither is known.
 */
export function expectedFinal(
  og: number | null,
  plannedFg: number | null,
  attenuation: number | null,
): number | null {
  if (plannedFg !== null) return plannedFg;
  return og === null || attenuation === null ? null : gravityAt(og, attenuation);
}
