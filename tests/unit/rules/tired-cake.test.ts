import { describe, expect, test } from 'vitest';
import { abv } from '#shared/units/alcohol.ts';
import { ale, check, missingFor, standing } from '../../support/links.ts';

const at = (og: number, fg: number, viability?: number) =>
  standing(
    check({
      a: {
        ...ale('a', og, 6, 25),
        fg,
        ...(viability === undefined ? {} : { measuredCake: { viability } }),
      },
      b: ale('b', og, 6, 25),
    }),
    'tired-cake',
  );

/** Final gravity at which a beer of this original has this alcohol; bisection. */
function finalFor(og: number, alcohol: number): number {
  let low = 0.985;
  let high = og;
  for (let step = 0; step < 60; step += 1) {
    const middle = (low + high) / 2;
    if (abv(og, middle) > alcohol) low = middle;
    else high = middle;
  }
  return high;
}

describe('tired-cake', () => {
  test.each([
    [1.065, 'passed'],
    [1.0651, 'mind'],
    [1.074, 'mind'],
    [1.0741, 'hold'],
  ])('original gravity %d: %s', (og, expected) => expect(at(og, 1.03)).toBe(expected));

  test.each([
    [6.49, 'passed'],
    [6.51, 'mind'],
    [7.99, 'mind'],
    [8.01, 'hold'],
  ])('%d %% ABV: %s', (alcohol, expected) =>
    expect(at(1.064, finalFor(1.064, alcohol))).toBe(expected),
  );

  test('a count of 90 % alive turns the hold into a mind', () => {
    expect(at(1.09, 1.02, 0.9)).toBe('mind');
    expect(at(1.09, 1.02, 0.899)).toBe('hold');
    expect(at(1.05, 1.012, 0.9)).toBe('passed');
  });

  test('a gravity that decides needs no final gravity', () => {
    const under = (og: number) => {
      const { fg: _f, ...open } = ale('a', og, 6, 25);
      return check({ a: open, b: ale('b', og, 6, 25) });
    };
    expect(standing(under(1.08), 'tired-cake')).toBe('hold');
    expect(standing(under(1.07), 'tired-cake')).toBe('mind');
    expect(missingFor(under(1.06), 'tired-cake')).toEqual(['fg']);
  });
});
