import { expect, test } from 'vitest';
import { styleNamed, type Range } from '#shared/styles/styles.ts';

/**
 * A sanity check, not a validation: ranges of the BJCP guidelines of 2021, from memory and in their
 * numbers alone, overlap ours in every figure. OG, FG, IBU, SRM, ABV.
 */
const REMEMBERED: [string, string, Range, Range, Range, Range, Range][] = [
  ['1A', 'Light lager', [1.028, 1.04], [0.998, 1.008], [8, 12], [2, 3], [2.8, 4.2]],
  ['1C', 'Cream ale', [1.042, 1.055], [1.006, 1.012], [8, 20], [2, 5], [4.2, 5.6]],
  ['3B', 'Pilsner', [1.044, 1.06], [1.013, 1.017], [30, 45], [3.5, 6], [4.2, 5.8]],
  ['5B', 'Kölsch', [1.044, 1.05], [1.007, 1.011], [18, 30], [3.5, 5], [4.4, 5.2]],
  ['5D', 'Pilsner', [1.044, 1.05], [1.008, 1.013], [22, 40], [2, 4], [4.4, 5.2]],
  ['9A', 'Doppelbock', [1.072, 1.112], [1.016, 1.024], [16, 26], [6, 25], [7, 10]],
  ['9C', 'Baltic porter', [1.06, 1.09], [1.016, 1.024], [20, 40], [17, 30], [6.5, 9.5]],
  ['11B', 'Best bitter', [1.04, 1.048], [1.008, 1.012], [25, 40], [8, 16], [3.8, 4.6]],
  ['13C', 'Porter', [1.04, 1.052], [1.008, 1.014], [18, 35], [20, 30], [4, 5.4]],
  ['15B', 'Dry stout', [1.036, 1.044], [1.007, 1.011], [25, 45], [25, 40], [3.8, 5]],
  ['17D', 'Barley wine', [1.08, 1.12], [1.018, 1.03], [35, 70], [8, 22], [8, 12]],
  ['18A', 'Blonde ale', [1.038, 1.054], [1.008, 1.013], [15, 28], [3, 6], [3.8, 5.5]],
  ['18B', 'Pale ale', [1.045, 1.06], [1.01, 1.015], [30, 50], [5, 10], [4.5, 6.2]],
  ['20C', 'Imperial stout', [1.075, 1.115], [1.018, 1.03], [50, 90], [30, 40], [8, 12]],
  ['21A', 'IPA', [1.056, 1.07], [1.008, 1.014], [40, 70], [6, 14], [5.5, 7.5]],
  ['22A', 'Double IPA', [1.065, 1.085], [1.008, 1.018], [60, 100], [6, 14], [7.5, 10]],
  ['23A', 'Sour wheat beer', [1.028, 1.032], [1.003, 1.006], [3, 8], [2, 3], [2.8, 3.8]],
];

/** Overlap by more than half of the narrower range. */
const overlaps = ([a, b]: Range, [c, d]: Range) =>
  Math.min(b, d) - Math.max(a, c) >= 0.5 * Math.min(b - a, d - c);

test.each(REMEMBERED)('%s beside %s', (_class, name, og, fg, ibu, srm, abv) => {
  const style = styleNamed(name);
  expect(style).toBeDefined();
  if (!style) return;
  expect(overlaps(style.og, og)).toBe(true);
  expect(overlaps(style.fg, fg)).toBe(true);
  expect(overlaps(style.ibu, ibu)).toBe(true);
  expect(overlaps(style.srm, srm)).toBe(true);
  expect(overlaps(style.abv, abv)).toBe(true);
});
