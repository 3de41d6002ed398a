import { describe, expect, test } from 'vitest';
import type { Inheritance } from '#shared/rules/facts.ts';
import { CULTURES, type Culture } from '#shared/rules/vocabulary.ts';
import { blonde, check, missingFor, paleAle, standing } from '../../support/links.ts';

const RULE = 'wild-culture';
const link = (
  inherited: Partial<Inheritance>,
  a: readonly Culture[] | undefined,
  b: readonly Culture[] | undefined,
  softened = false,
) => {
  const { cultures: _a, ...earlier } = blonde();
  const { cultures: _b, ...later } = paleAle();
  return check({
    a: a === undefined ? earlier : { ...earlier, cultures: a },
    b: b === undefined ? later : { ...later, cultures: b },
    rules: softened ? { softened: new Set([RULE]) } : {},
    rest: { inherited: { allergens: [], cultures: [], ...inherited } },
  });
};

describe('wild-culture', () => {
  test.each(CULTURES)('%s holds until it is declared', (culture) => {
    expect(standing(link({}, [culture], []), RULE)).toBe('hold');
    expect(standing(link({}, [culture], [culture]), RULE)).toBe('passed');
    expect(standing(link({ cultures: [culture] }, [], []), RULE)).toBe('hold');
  });

  test('one declared of two is not enough', () =>
    expect(standing(link({}, ['bacteria', 'diastatic'], ['bacteria']), RULE)).toBe('hold'));

  test('what is unknown is unchecked, unless what is known decides', () => {
    expect(missingFor(link({}, undefined, []), RULE)).toEqual(['cultures']);
    expect(missingFor(link({}, ['bacteria'], undefined), RULE)).toEqual(['cultures']);
    expect(standing(link({}, [], undefined), RULE)).toBe('passed');
    expect(standing(link({ cultures: ['enzyme'] }, undefined, []), RULE)).toBe('hold');
    expect(standing(link({}, undefined, CULTURES), RULE)).toBe('passed');
    expect(missingFor(link({ culturesUnknown: true }, [], []), RULE)).toEqual(['cultures']);
  });
});
