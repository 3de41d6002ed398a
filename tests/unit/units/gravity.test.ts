import { expect, test } from 'vitest';
import { abv } from '#shared/units/alcohol.ts';
import { apparentExtract, platoFromSg, points, sgFromPlato } from '#shared/units/gravity.ts';

test('points are rounded to a tenth', () => {
  expect(points(1.0524)).toBe(52.4);
  expect(points(1.05238)).toBe(52.4);
  expect(points(0.998)).toBe(-2);
  expect(points(1.095 - 1.044 + 1)).toBe(51);
});

test('a wort lighter than water has no extract; a beer may fall below', () => {
  expect(platoFromSg(0.998)).toBe(0);
  expect(apparentExtract(0.998)).toBeCloseTo(-0.52, 2);
  expect(apparentExtract(1)).toBe(0);
  expect(sgFromPlato(apparentExtract(0.998))).toBeCloseTo(0.998, 12);
});

test('alcohol keeps rising as the final gravity falls below 1', () => {
  expect(abv(1.05, 0.998)).toBeGreaterThan(abv(1.05, 1));
  expect(abv(1.05, 1)).toBeGreaterThan(abv(1.05, 1.01));
});

test('no fermentation, no alcohol', () => {
  expect(abv(1.05, 1.05)).toBe(0);
  expect(abv(1.05, 1.06)).toBe(0);
});
