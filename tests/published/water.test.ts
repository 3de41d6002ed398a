import { describe, expect, test } from 'vitest';
import { correctedSg, waterDensity } from '#shared/units/water.ts';

/** Tanaka et al. 2001, Metrologia 38:301, 0–40 °C, kg/m³: another fit to other measurements. */
const tanaka = (t: number) =>
  999.97495 * (1 - ((t - 3.983035) ** 2 * (t + 301.797)) / (522528.9 * (t + 69.34881)));

test.each([0, 4, 10, 15, 15.56, 20, 25, 30, 35, 40])(
  '%d °C: within 0.004 kg/m³ of Tanaka et al. 2001 (looked up)',
  (t) => expect(Math.abs(waterDensity(t) - tanaka(t))).toBeLessThanOrEqual(0.004),
);

test.each([
  [4, 999.972],
  [10, 999.7026],
  [20, 998.2071],
  [25, 997.0479],
  [60, 983.2],
])('%d °C: %d kg/m³ in the usual tables, within 0.02 (from memory)', (t, density) => {
  expect(Math.abs(waterDensity(t) - density)).toBeLessThanOrEqual(0.02);
});

describe('hydrometer of 60 °F: the trade’s table of points to add (from memory)', () => {
  test.each([
    [70, 1],
    [77, 2],
    [84, 3],
    [95, 5],
  ])('%d °F: %d points', (fahrenheit, add) => {
    const corrected = correctedSg(1.05, (fahrenheit - 32) / 1.8, 15.56);
    expect(Math.abs((corrected - 1.05) * 1000 - add)).toBeLessThan(0.5);
  });
});

test('outside the range it refuses', () => {
  expect(() => waterDensity(-1)).toThrow(RangeError);
  expect(() => correctedSg(1.05, 41)).toThrow(RangeError);
});
