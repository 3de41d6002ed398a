import { describe, expect, test } from 'vitest';
import { sgFromBrix, valueOf } from '#shared/fermentation/correct.ts';

const hydrometer = (shown: number, sampleC: number | null) =>
  ({ kind: 'gravity', method: 'hydrometer', shown, sampleC }) as const;

describe('a hydrometer made for 60 °F: the trade’s table of points to add (from memory)', () => {
  test.each([
    [60, 0],
    [70, 1],
    [77, 2],
    [84, 3],
    [95, 5],
  ])('%d °F: %d points', (fahrenheit, add) => {
    const value = valueOf(hydrometer(1.05, (fahrenheit - 32) / 1.8), {
      correction: 0,
      calibratedC: 15.56,
    });
    expect(Math.abs((value - 1.05) * 1000 - add)).toBeLessThan(0.6);
  });
});

test('one’s own hydrometer that reads 0.002 high is brought down first', () => {
  const value = valueOf(hydrometer(1.052, 20), { correction: -0.002, calibratedC: 20 });
  expect(value).toBeCloseTo(1.05, 9);
});

test('without a sample’s temperature it is taken as read', () =>
  expect(valueOf(hydrometer(1.012, null), null)).toBe(1.012));

describe('sucrose by refractometer, SG 20/20 °C: ASBC extract table (from memory), wort at ÷ 1.04', () => {
  test.each([
    [10, 1.04003],
    [12, 1.04837],
    [15, 1.06111],
  ])('%d °P is %d', (plato, sg) => expect(sgFromBrix(plato * 1.04)).toBeCloseTo(sg, 4));
});

test('beyond what is known it refuses', () => {
  expect(() => valueOf(hydrometer(1.05, 41), null)).toThrow(RangeError);
  expect(() => sgFromBrix(41)).toThrow(RangeError);
});

test('a thermometer and a pH meter are corrected by their own error', () => {
  const own = { correction: -0.4, calibratedC: null };
  expect(valueOf({ kind: 'temperature', method: null, shown: 19.4, sampleC: null }, own)).toBe(19);
});
