import { describe, expect, test } from 'vitest';
import type { Inheritance } from '#shared/rules/facts.ts';
import { ale, check, CLEAN_ALE, missingFor, standing } from '../../support/links.ts';

const answer = (
  generation: number | undefined,
  strongestOg?: number,
  limit: number | undefined = 7,
  og: number | undefined = 1.04,
) => {
  const inherited: Inheritance = {
    allergens: [],
    cultures: [],
    ...(strongestOg === undefined ? {} : { strongestOg }),
  };
  const { generationLimit: _l, ...open } = CLEAN_ALE;
  const { og: _o, ...beer } = ale('a', 1.04, 6, 25);
  return check({
    a: og === undefined ? beer : { ...beer, og },
    b: ale('b', 1.04, 6, 25),
    yeast: limit === 0 ? open : { ...open, generationLimit: limit },
    rest: { generation, inherited },
  });
};
const at = (...of: Parameters<typeof answer>) => standing(answer(...of), 'generation');

describe('generation', () => {
  test.each([
    [7, undefined, 'passed'],
    [8, undefined, 'mind'],
    [10, undefined, 'mind'],
    [11, undefined, 'hold'],
    [5, 1.061, 'passed'],
    [6, 1.061, 'mind'],
    [7, 1.0609, 'passed'],
    [8, 1.061, 'mind'],
    [9, 1.061, 'hold'],
    [4, 1.074, 'passed'],
    [5, 1.074, 'mind'],
    [5, 1.0739, 'passed'],
    [8, 1.074, 'hold'],
  ])('generation %d after %s: %s', (generation, strongest, expected) =>
    expect(at(generation, strongest)).toBe(expected),
  );

  test('A itself may have been the strong one', () => {
    expect(at(6, undefined, 7, 1.061)).toBe('mind');
    expect(at(5, 1.05, 7, 1.074)).toBe('mind');
  });

  test('the yeast’s own limit, or 7', () => {
    expect(at(4, undefined, 3)).toBe('mind');
    expect(at(4, 1.061, 3)).toBe('mind');
    expect(at(7, undefined, 0)).toBe('passed');
    expect(at(8, undefined, 0)).toBe('mind');
    expect(at(12, undefined, 12)).toBe('passed');
    expect(at(6, 1.061, 12)).toBe('mind');
  });

  test('unknown generation, unknown gravity', () => {
    const { generation: _g, ...rest } = { generation: 1 };
    const unknown = check({
      a: ale('a', 1.04, 6, 25),
      b: ale('b', 1.04, 6, 25),
      rest: { ...rest, generation: undefined },
    });
    expect(missingFor(unknown, 'generation')).toEqual(['firstGeneration']);
    const { og: _o, ...open } = ale('a', 1.04, 6, 25);
    const later = (generation: number) =>
      check({ a: open, b: ale('b', 1.04, 6, 25), rest: { generation } });
    expect(standing(later(4), 'generation')).toBe('passed');
    expect(missingFor(later(5), 'generation')).toEqual(['og']);
    expect(standing(later(8), 'generation')).toBe('mind');
  });
});
