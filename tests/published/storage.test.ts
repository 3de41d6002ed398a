import { describe, expect, test } from 'vitest';
import { survival, survivalRange } from '#shared/yeast/storage.ts';

const MCCAIG_1 = 'McCaig & Bendiak 1985, MBAA TQ 22(4):172–176, I';
const MCCAIG_2 = 'McCaig & Bendiak 1985, MBAA TQ 22(4), II';

test('three days at 1.6 °C leave 90 to 96 %: Sall et al. 1988 in Boulton & Quain 2001, 7.3 (looked up)', () => {
  expect(survival(3, 1.6)).toBeGreaterThanOrEqual(0.9);
  expect(survival(3, 1.6)).toBeLessThanOrEqual(0.96);
});

describe('in-sample: the four points of the fit (looked up)', () => {
  test.each([
    [6, 1, 0.93, MCCAIG_2],
    [6, 5, 0.86, MCCAIG_2],
    // "Up to 68 % lost at 10 to 25 °C": taken as the value at 25 °C, which is our reading.
    [6, 25, 0.32, MCCAIG_2],
    [5, 1, 0.92, MCCAIG_1],
  ] as const)('%d days at %d °C leave %d: %s', (days, celsius, left, _source) => {
    expect(Math.abs(survival(days, celsius) - left)).toBeLessThanOrEqual(0.03);
  });
});

describe('in-sample: the stated range, chosen to cover these', () => {
  test.each([
    [14, 22, 0.05, 'C. White 2001, yeast in sterile water at room temperature (looked up)'],
    [30, 4, 0.94, 'seven slurries counted by a home brewer, 2012 (second-hand)'],
    [30, 4, 0.49, 'a supplier: under half after a month in the cold (second-hand)'],
  ] as const)('%d days at %d °C may leave %d: %s', (days, celsius, left, _source) => {
    const { low, high } = survivalRange(days, celsius);
    expect(left).toBeGreaterThanOrEqual(low);
    expect(left).toBeLessThanOrEqual(high + 0.001);
  });
});
