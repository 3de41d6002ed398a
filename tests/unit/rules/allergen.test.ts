import { describe, expect, test } from 'vitest';
import type { Inheritance } from '#shared/rules/facts.ts';
import { ALLERGENS, type Allergen } from '#shared/rules/vocabulary.ts';
import { blonde, check, missingFor, paleAle, standing } from '../../support/links.ts';

const RULE = 'allergen';
const link = (
  inherited: Partial<Inheritance>,
  a: readonly Allergen[] | undefined,
  b: readonly Allergen[] | undefined,
) => {
  const { allergens: _a, ...earlier } = blonde();
  const { allergens: _b, ...later } = paleAle();
  return check({
    a: a === undefined ? earlier : { ...earlier, allergens: a },
    b: b === undefined ? later : { ...later, allergens: b },
    rest: { inherited: { allergens: [], cultures: [], ...inherited } },
  });
};

describe('allergen', () => {
  test.each(ALLERGENS)('%s holds until it is declared', (one) => {
    expect(standing(link({}, [one], []), RULE)).toBe('hold');
    expect(standing(link({}, [one], [one]), RULE)).toBe('passed');
    expect(standing(link({ allergens: [one] }, [], []), RULE)).toBe('hold');
  });

  test('no dilution makes it go away', () => {
    const { allergens: _a, ...rest } = blonde();
    const trace = check({
      a: { ...rest, allergens: ['peanut'] },
      b: paleAle(),
      pour: { keepL: 0.001 },
    });
    expect(standing(trace, RULE)).toBe('hold');
  });

  test('what is unknown is unchecked, unless what is known decides', () => {
    expect(missingFor(link({}, undefined, []), RULE)).toEqual(['allergens']);
    expect(missingFor(link({}, ['milk'], undefined), RULE)).toEqual(['allergens']);
    expect(standing(link({}, [], undefined), RULE)).toBe('passed');
    expect(standing(link({ allergens: ['milk'] }, undefined, []), RULE)).toBe('hold');
    expect(standing(link({}, undefined, ALLERGENS), RULE)).toBe('passed');
    expect(missingFor(link({ allergensUnknown: true }, [], []), RULE)).toEqual(['allergens']);
  });
});
