import { expect, test } from 'vitest';
import { abv, alcoholByWeight, realExtract } from '#shared/units/alcohol.ts';
import { beerLab } from '#shared/units/colour.ts';
import { relativeAbsorbance } from '#shared/units/beerSpectrum.ts';
import { apparentExtract, platoFromSg } from '#shared/units/gravity.ts';
import { luminance } from '#shared/units/srgb.ts';

test('unfermented wort keeps all its extract', () => {
  expect(realExtract(12, 12)).toBeCloseTo(12, 12);
  expect(alcoholByWeight(12, 12)).toBeCloseTo(0, 12);
});

test('the original extract is found again by Balling’s formula', () => {
  const [oe, ae] = [14, 3];
  const [re, a] = [realExtract(oe, ae), alcoholByWeight(oe, ae)];
  expect((100 * (re + 2.0665 * a)) / (100 + 1.0665 * a)).toBeCloseTo(oe, 2);
});

test('by volume: alcohol is 0.7893 g/mL and water 0.9982 at 20 °C (usual tables, from memory)', () => {
  const weight = alcoholByWeight(platoFromSg(1.05), apparentExtract(1.01));
  expect(abv(1.05, 1.01)).toBeCloseTo((weight * 1.01) / (0.7893 / 0.9982), 2);
});

test('near the trade’s rule of thumb, 131.25 × the fall in gravity (from memory)', () => {
  expect(Math.abs(abv(1.05, 1.01) - 131.25 * 0.04)).toBeLessThan(0.15);
});

test('the same formulas computed apart: guards the constants, validates nothing', () => {
  expect(relativeAbsorbance(700)).toBeCloseTo(0.0364159, 6);
  const [l, a, b] = beerLab(4, 5);
  expect([l, a, b].map((value) => value.toFixed(1))).toEqual(['73.7', '11.4', '66.7']);
});

test('luminance of the primaries of sRGB and of white: WCAG 2, by definition', () => {
  expect(luminance([255, 0, 0])).toBeCloseTo(0.2126, 9);
  expect(luminance([0, 255, 0])).toBeCloseTo(0.7152, 9);
  expect(luminance([255, 255, 255])).toBeCloseTo(1, 9);
});
