import { beerRgb } from '#shared/units/colour.ts';

/**
 * Paints of a beer for both themes at once, as CSS `light-dark()`, so that nothing is drawn again
 * when the theme changes. In the dark theme the light comes from behind: a shorter path.
 */
const ACROSS = [-1, -0.86, -0.66, -0.36, 0, 0.36, 0.66, 0.86, 1] as const;
const DIAMETER_CM = { light: 4.2, dark: 2.6 } as const;
const FLAT_CM = { light: 3.4, dark: 2.2 } as const;
const LAMP_CM = 1.2;

export interface Stop {
  offset: number;
  colour: string;
}

const both = (light: string, dark: string) => `light-dark(${light}, ${dark})`;
/** Light's way through a round vessel at `u` from −1 (left wall) to 1 (right wall), cm. */
export const pathAcross = (diameterCm: number, u: number): number =>
  Math.max(0.9, diameterCm * Math.sqrt(1 - u * u * 0.985));

const made = new Map<number, readonly Stop[]>();

/** The gradient from wall to wall of a round vessel. */
export function vesselStops(srm: number): readonly Stop[] {
  const known = made.get(srm);
  if (known) return known;
  const stops = ACROSS.map((u) => ({
    offset: (u + 1) / 2,
    colour: both(
      beerRgb(srm, pathAcross(DIAMETER_CM.light, u)),
      beerRgb(srm, pathAcross(DIAMETER_CM.dark, u)),
    ),
  }));
  made.set(srm, stops);
  return stops;
}

/** One flat colour: swatch, bar, bench label. */
export const flatBeer = (srm: number): string =>
  both(beerRgb(srm, FLAT_CM.light), beerRgb(srm, FLAT_CM.dark));

/** The cellar lamp behind a vessel. */
export const lampColour = (srm: number): string => beerRgb(srm, LAMP_CM);
