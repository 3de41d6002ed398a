import type { Xyz } from './observer.ts';

/** Red, green, blue, 0–255. */
export type Rgb = readonly [number, number, number];

/** Linear light of the three channels, 0–1, from XYZ (Y of D65 white = 100). IEC 61966-2-1. */
function linearSrgb([x, y, z]: Xyz): Rgb {
  const [X, Y, Z] = [x / 100, y / 100, z / 100];
  return [
    3.2404542 * X - 1.5371385 * Y - 0.4985314 * Z,
    -0.969266 * X + 1.8760108 * Y + 0.041556 * Z,
    0.0556434 * X - 0.2040259 * Y + 1.0572252 * Z,
  ];
}

function channel(linear: number): number {
  const light = Math.min(1, Math.max(0, linear));
  const code = light <= 0.0031308 ? 12.92 * light : 1.055 * light ** (1 / 2.4) - 0.055;
  return Math.round(255 * code);
}

/** sRGB of XYZ (IEC 61966-2-1, constants from memory); what the screen cannot show is clipped. */
export function srgb(xyz: Xyz): Rgb {
  const [r, g, b] = linearSrgb(xyz);
  return [channel(r), channel(g), channel(b)];
}

/** Relative luminance of an sRGB colour, 0–1, as WCAG 2 defines it for contrast. */
export function luminance(rgb: Rgb): number {
  const [r, g, b] = rgb.map((code) => {
    const c = code / 255;
    return c <= 0.04045 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * (r ?? 0) + 0.7152 * (g ?? 0) + 0.0722 * (b ?? 0);
}
