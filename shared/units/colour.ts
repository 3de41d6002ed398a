import { beerXyz, SRM_PER_A430, WHITE } from './beerSpectrum.ts';
import { luminance, srgb } from './srgb.ts';

/** CIE L*, a*, b*. */
export type Lab = readonly [number, number, number];

/** EBC of a beer whose absorbance at 430 nm is 1 in 1 cm (EBC Analytica 9.6). */
const EBC_PER_A430 = 25;

/** SRM from absorbance at 430 nm in 1 cm (ASBC MOA Beer-10). */
export const srmFromAbsorbance = (a430: number): number => SRM_PER_A430 * a430;

/** EBC from SRM: 1.9685 of it, by the two definitions. */
export const ebcFromSrm = (srm: number): number => (srm * EBC_PER_A430) / SRM_PER_A430;
export const srmFromEbc = (ebc: number): number => (ebc * SRM_PER_A430) / EBC_PER_A430;

/** The glass in which colours are compared, cm. */
export const GLASS_CM = 5;

/** CIE 1976 lightness function. */
const f = (t: number): number => (t > 216 / 24389 ? Math.cbrt(t) : ((24389 / 27) * t + 16) / 116);

/** L*a*b* (D65, 2°) of a bright beer of this SRM, seen through a path in cm against daylight. */
export function beerLab(srm: number, pathCm: number): Lab {
  const [x, y, z] = beerXyz(srm * pathCm);
  const fy = f(y / WHITE[1]);
  return [116 * fy - 16, 500 * (f(x / WHITE[0]) - fy), 200 * (fy - f(z / WHITE[2]))];
}

interface Shade {
  css: string;
  dark: boolean;
}

const shades = new Map<number, Shade>();
const MOST_SHADES = 4000;

/** Shades are remembered by SRM × path to 0.05, finer than a step of 8-bit colour. */
function shadeOf(srm: number, pathCm: number): Shade {
  const key = Math.round(Math.max(0, srm * pathCm) * 20);
  const known = shades.get(key);
  if (known) return known;
  const rgb = srgb(beerXyz(key / 20));
  // Black and white contrast equally with luminance 0.179 (WCAG 2: (L + 0.05)² = 1.05 × 0.05).
  const shade = { css: `rgb(${rgb.join(' ')})`, dark: luminance(rgb) < 0.179 };
  if (shades.size >= MOST_SHADES) shades.clear();
  shades.set(key, shade);
  return shade;
}

/** Colour of a beer as CSS writes it, `rgb(r g b)`. */
export const beerRgb = (srm: number, pathCm: number): string => shadeOf(srm, pathCm).css;

/** The text colour, black or white, that contrasts more with `beerRgb` (WCAG 2). */
export const blackOrWhiteOn = (srm: number, pathCm: number): 'black' | 'white' =>
  shadeOf(srm, pathCm).dark ? 'white' : 'black';
