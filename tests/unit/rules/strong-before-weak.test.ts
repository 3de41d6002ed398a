import { describe, expect, test } from 'vitest';
import { ale, check, missingFor, standing } from '../../support/links.ts';

const answer = (a: number, b: number) => check({ a: ale('a', a, 6, 25), b: ale('b', b, 6, 25) });

describe('strong-before-weak', () => {
  test.each([
    [1.055, 1.0401, 'passed'],
    [1.055, 1.04, 'mind'],
    [1.0699, 1.04, 'mind'],
    [1.07, 1.04, 'hold'],
    [1.06, 1.03, 'hold'],
    [1.0599, 1.0299, 'mind'],
    [1.04, 1.06, 'passed'],
  ])('%d before %d: %s', (a, b, expected) =>
    expect(standing(answer(a, b), 'strong-before-weak')).toBe(expected),
  );

  test('a missing gravity is named', () => {
    const { og: _o, ...unknown } = ale('b', 1.04, 6, 25);
    const link = check({ a: ale('a', 1.09, 6, 25), b: unknown });
    expect(missingFor(link, 'strong-before-weak')).toEqual(['og']);
  });
});
