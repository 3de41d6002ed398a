import { expect, test } from 'vitest';
import { HOUSE_RULES } from '#shared/rules/houseRules.ts';
import { ALLERGENS } from '#shared/rules/vocabulary.ts';
import { KG_PER_POUND } from '#shared/units/mass.ts';
import { LITRES_PER_GALLON } from '#shared/units/volume.ts';

test('fourteen groups of allergens: Regulation (EU) 1169/2011, Annex II (looked up)', () => {
  expect(new Set(ALLERGENS).size).toBe(14);
});

test('generations: 5 from 15 °P, 4 from 18 °P, EEJET 2021, doi 10.15587/1729-4061.2021.248126 (looked up)', () => {
  expect(HOUSE_RULES.generationsFrom15P.default).toBe(5);
  expect(HOUSE_RULES.generationsFrom18P.default).toBe(4);
});

test('and the usual limit lies below what plants reuse at 12 to 18 °P: Stewart 2015, in Quain (looked up)', () => {
  const cycles = { 12: 20, 14: 16, 16: 12, 18: 8 };
  for (const most of Object.values(cycles))
    expect(HOUSE_RULES.generations.default).toBeLessThan(most);
});

test('a US gallon is 3.785411784 L, a pound 0.45359237 kg: NIST Handbook 44, Appendix C (from memory)', () => {
  expect(LITRES_PER_GALLON).toBeCloseTo(3.785411784, 9);
  expect(LITRES_PER_GALLON * 1000).toBeCloseTo(231 * 2.54 ** 3, 6);
  expect(KG_PER_POUND).toBe(0.45359237);
});
