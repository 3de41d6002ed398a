import { expect, test } from 'vitest';
import type { Lab } from '#shared/units/colour.ts';
import { deltaE00 } from '#shared/units/deltaE.ts';

/**
 * Pairs of Table 1 of Sharma, Wu & Dalal 2005, Color Res. Appl. 30:21–30, by their number there.
 * The first ones were looked up in the test data of an open-source image library.
 */
const PAIRS: [number, Lab, Lab, number, 'looked up' | 'from memory'][] = [
  [1, [50, 2.6772, -79.7751], [50, 0, -82.7485], 2.0425, 'looked up'],
  [2, [50, 3.1571, -77.2803], [50, 0, -82.7485], 2.8615, 'looked up'],
  [3, [50, 2.8361, -74.02], [50, 0, -82.7485], 3.4412, 'looked up'],
  [7, [50, 0, 0], [50, -1, 2], 2.3669, 'from memory'],
  [9, [50, 2.49, -0.001], [50, -2.49, 0.0009], 7.1792, 'from memory'],
  [16, [50, 2.5, 0], [50, 0, -2.5], 4.3065, 'from memory'],
  [17, [50, 2.5, 0], [73, 25, -18], 27.1492, 'from memory'],
  [18, [50, 2.5, 0], [61, -5, 29], 22.8977, 'from memory'],
  [19, [50, 2.5, 0], [56, -27, -3], 31.903, 'from memory'],
  [25, [60.2574, -34.0099, 36.2677], [60.4626, -34.1751, 39.4387], 1.2644, 'from memory'],
  [26, [63.0109, -31.0961, -5.8663], [62.8187, -29.7946, -4.0864], 1.263, 'from memory'],
  [29, [22.7233, 20.0904, -46.694], [23.0331, 14.973, -42.5619], 2.0373, 'from memory'],
  [31, [90.8027, -2.0831, 1.441], [91.1528, -1.6435, 0.0447], 1.4441, 'from memory'],
  [33, [6.7747, -0.2908, -2.4247], [5.8714, -0.0985, -2.2286], 0.6377, 'from memory'],
  [34, [2.0776, 0.0795, -1.135], [0.9033, -0.0636, -0.5514], 0.9082, 'from memory'],
];

test.each(PAIRS)('pair %i', (_pair, lab1, lab2, expected) => {
  expect(Math.abs(deltaE00(lab1, lab2) - expected)).toBeLessThanOrEqual(1e-4);
  expect(Math.abs(deltaE00(lab2, lab1) - expected)).toBeLessThanOrEqual(1e-4);
});
