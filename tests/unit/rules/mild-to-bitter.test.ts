import { describe, expect, test } from 'vitest';
import { ale, check, missingFor, standing, type Case } from '../../support/links.ts';

const ibu = (a: number, b: number, more: Partial<Case> = {}) =>
  check({ a: ale('a', 1.05, 6, a), b: ale('b', 1.05, 6, b), ...more });
const at = (...of: Parameters<typeof ibu>) => standing(ibu(...of), 'mild-to-bitter');

/** Retained beer for a shift of exactly `shift` IBU: all of it left above, none in the cake. */
const shifting = (a: number, b: number, shift: number): Partial<Case> => {
  const retained = (23 * shift) / (a - b - shift);
  const measuredCake = { volumeL: 0.001 };
  return {
    a: { ...ale('a', 1.05, 6, a), measuredCake },
    pour: { leftAboveL: retained - 0.0005 },
  };
};

describe('mild-to-bitter', () => {
  test.each([
    [14.99, 1.5, 'passed'],
    [15, 0.99, 'passed'],
    [15, 1, 'mind'],
    [39.99, 2, 'mind'],
    [40, 1.99, 'mind'],
    [40, 2, 'hold'],
    [30, 4.99, 'mind'],
    [30, 5, 'hold'],
    [14.9, 5, 'hold'],
    [14.9, 4.99, 'passed'],
  ])('bitterer by %d and moved by %d IBU: %s', (gap, shift, expected) =>
    expect(at(20 + gap, 20, shifting(20 + gap, 20, shift))).toBe(expected),
  );

  test('a move of 5 IBU is a hold downwards too', () => {
    expect(at(10, 110, shifting(10, 110, -5))).toBe('hold');
    expect(at(10, 110, shifting(10, 110, -4.9))).toBe('passed');
  });

  test('what is known may decide without the rest', () => {
    const { fg: _f, ...noEnd } = ale('a', 1.05, 6, 24);
    const b = ale('b', 1.05, 6, 20);
    expect(standing(check({ a: noEnd, b }), 'mild-to-bitter')).toBe('passed');
    expect(missingFor(check({ a: { ...noEnd, ibu: 40 }, b }), 'mild-to-bitter')).toEqual(['fg']);
    const { ibu: _i, ...unknown } = noEnd;
    expect(missingFor(check({ a: unknown, b }), 'mild-to-bitter')).toEqual(['ibu']);
    expect(at(100, 20, { pour: { keepL: 0 } })).toBe('passed');
  });
});
