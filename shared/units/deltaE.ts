import type { Lab } from './colour.ts';

const DEGREE = Math.PI / 180;
const POW25_7 = 25 ** 7;

const hue = (a: number, b: number): number => {
  if (a === 0 && b === 0) return 0;
  const degrees = Math.atan2(b, a) / DEGREE;
  return degrees < 0 ? degrees + 360 : degrees;
};

/** From the first hue to the second by the shorter way, degrees. */
function hueStep(h1: number, h2: number): number {
  const step = h2 - h1;
  return step > 180 ? step - 360 : step < -180 ? step + 360 : step;
}

function meanHue(h1: number, h2: number): number {
  const sum = h1 + h2;
  if (Math.abs(h1 - h2) <= 180) return sum / 2;
  return sum < 360 ? (sum + 360) / 2 : (sum - 360) / 2;
}

/** Weight T of the hue difference, eq. 15. */
const hueWeight = (h: number): number =>
  1 -
  0.17 * Math.cos((h - 30) * DEGREE) +
  0.24 * Math.cos(2 * h * DEGREE) +
  0.32 * Math.cos((3 * h + 6) * DEGREE) -
  0.2 * Math.cos((4 * h - 63) * DEGREE);

const chromaShare = (c: number): number => {
  const c2 = c * c;
  const c7 = c2 * c2 * c2 * c;
  return Math.sqrt(c7 / (c7 + POW25_7));
};

/** Of two sides: `Math.hypot` takes any number, and that costs. */
const chroma = (a: number, b: number): number => Math.sqrt(a * a + b * b);

/**
 * Colour difference CIEDE2000 with unit weights, after Sharma, Wu & Dalal 2005, Color Res. Appl.
 * 30:21–30, whose equations it follows and whose test pairs it meets.
 */
export function deltaE00([l1, a1, b1]: Lab, [l2, a2, b2]: Lab): number {
  const stretch = 1.5 - 0.5 * chromaShare((chroma(a1, b1) + chroma(a2, b2)) / 2);
  const c1 = chroma(a1 * stretch, b1);
  const c2 = chroma(a2 * stretch, b2);
  const h1 = hue(a1 * stretch, b1);
  const h2 = hue(a2 * stretch, b2);
  const grey = c1 * c2 === 0;
  const h = grey ? h1 + h2 : meanHue(h1, h2);
  const c = (c1 + c2) / 2;
  const l50 = ((l1 + l2) / 2 - 50) ** 2;

  const dL = (l2 - l1) / (1 + (0.015 * l50) / Math.sqrt(20 + l50));
  const dC = (c2 - c1) / (1 + 0.045 * c);
  const step = grey ? 0 : hueStep(h1, h2);
  const dH =
    (2 * Math.sqrt(c1 * c2) * Math.sin((step / 2) * DEGREE)) / (1 + 0.015 * c * hueWeight(h));
  const turn = -Math.sin(60 * Math.exp(-(((h - 275) / 25) ** 2)) * DEGREE) * 2 * chromaShare(c);
  return Math.sqrt(dL * dL + dC * dC + dH * dH + turn * dC * dH);
}
