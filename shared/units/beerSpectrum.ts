import { D65, SPECTRUM_FROM_NM, SPECTRUM_STEP_NM } from './daylight.ts';
import { observer, type Xyz } from './observer.ts';

/** SRM of a beer whose absorbance at 430 nm is 1 in 1 cm (ASBC MOA Beer-10). */
export const SRM_PER_A430 = 12.7;

/**
 * Absorbance of the average beer at a wavelength in nm, for 1 at 430 nm (deLange in Bamforth (ed.),
 * *Brewing Materials and Processes*, 2016; coefficients from memory). Beers with fruit differ.
 */
export const relativeAbsorbance = (nm: number): number =>
  0.02465 * Math.exp(-(nm - 430) / 17.591) + 0.97535 * Math.exp(-(nm - 430) / 82.122);

/** Each wavelength's exponent per SRM·cm and its weights, in one row of numbers for speed. */
const ROW = 4;
const table = new Float64Array(D65.length * ROW);
let xSum = 0;
let ySum = 0;
let zSum = 0;
D65.forEach((power, i) => {
  const nm = SPECTRUM_FROM_NM + i * SPECTRUM_STEP_NM;
  const [x, y, z] = observer(nm);
  table.set(
    [(-Math.LN10 / SRM_PER_A430) * relativeAbsorbance(nm), power * x, power * y, power * z],
    i * ROW,
  );
  xSum += power * x;
  ySum += power * y;
  zSum += power * z;
});

/** White of the same sums, Y = 100: what an empty glass shows. */
export const WHITE: Xyz = [(100 * xSum) / ySum, 100, (100 * zSum) / ySum];

/**
 * Tristimulus values (Y of white = 100) of daylight through `srmCm` = SRM × path in cm of bright
 * beer, by Beer and Lambert's law. Below 0 counts as 0.
 */
export function beerXyz(srmCm: number): Xyz {
  const depth = Math.max(0, srmCm);
  let x = 0;
  let y = 0;
  let z = 0;
  for (let at = 0; at < table.length; at += ROW) {
    const passed = Math.exp(depth * (table[at] ?? 0));
    x += passed * (table[at + 1] ?? 0);
    y += passed * (table[at + 2] ?? 0);
    z += passed * (table[at + 3] ?? 0);
  }
  return [(100 * x) / ySum, (100 * y) / ySum, (100 * z) / ySum];
}
