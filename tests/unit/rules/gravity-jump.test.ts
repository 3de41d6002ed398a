import { describe, expect, test } from 'vitest';
import { ale, check, missingFor, standing } from '../../support/links.ts';

const answer = (a: number, b: number, jumpHold: number | null = null) =>
  check({ a: ale('a', a, 6, 25), b: ale('b', b, 6, 25), rules: { jumpHold } });

describe('gravity-jump', () => {
  test.each([
    [1.04, 1.085, 'passed'],
    [1.04, 1.08504, 'passed'],
    [1.04, 1.0851, 'mind'],
    [1.04, 1.15, 'mind'],
    [1.06, 1.04, 'passed'],
  ])('%d to %d: %s', (a, b, expected) =>
    expect(standing(answer(a, b), 'gravity-jump')).toBe(expected),
  );

  test('more than 70 points is said more strongly', () => {
    const title = (b: number) =>
      answer(1.04, b).findings.find((one) => one.rule === 'gravity-jump')?.title;
    expect(title(1.1101)).not.toBe(title(1.11));
  });

  test('a house rule may hold it', () => {
    expect(standing(answer(1.04, 1.09, 50), 'gravity-jump')).toBe('mind');
    expect(standing(answer(1.04, 1.0901, 50), 'gravity-jump')).toBe('hold');
  });

  test('a missing gravity is named', () => {
    const { og: _o, ...unknown } = ale('a', 1.04, 6, 25);
    const link = check({ a: unknown, b: ale('b', 1.09, 6, 25) });
    expect(missingFor(link, 'gravity-jump')).toEqual(['og']);
  });
});
