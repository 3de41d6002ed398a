import { describe, expect, test } from 'vitest';
import type { DryHop } from '#shared/rules/facts.ts';
import { blonde, check, missingFor, paleAle, standing } from '../../support/links.ts';

const hop = (
  gramsPerLitre: number,
  contained: DryHop['contained'] = 'loose',
  timing: DryHop['timing'] = 'on-cake',
): DryHop => ({ gramsPerLitre, contained, timing });

const answer = (a: DryHop[] | undefined, b: DryHop[] | undefined = [hop(3)]) => {
  const { dryHops: _a, ...earlier } = blonde();
  const { dryHops: _b, ...later } = paleAle();
  return check({
    a: a === undefined ? earlier : { ...earlier, dryHops: a },
    b: b === undefined ? later : { ...later, dryHops: b },
  });
};
const at = (...of: Parameters<typeof answer>) => standing(answer(...of), 'hops-in-cake');

describe('hops-in-cake', () => {
  test.each([
    [0, 'passed'],
    [0.5, 'passed'],
    [0.51, 'mind'],
    [1, 'mind'],
    [5.99, 'mind'],
    [6, 'hold'],
  ])('%d g/L loose under a hoppy beer: %s', (grams, expected) =>
    expect(at([hop(grams)])).toBe(expected),
  );

  test.each([
    [0.5, 'passed'],
    [0.99, 'mind'],
    [1, 'hold'],
  ])('%d g/L loose under a beer without dry hops: %s', (grams, expected) => {
    expect(at([hop(grams)], [])).toBe(expected);
    expect(at([hop(grams)], [hop(0)])).toBe(expected);
  });

  test('bagged hops count a quarter, hops after the taking not at all', () => {
    expect(at([hop(2, 'bagged')])).toBe('passed');
    expect(at([hop(2.1, 'bagged')])).toBe('mind');
    expect(at([hop(24, 'bagged')])).toBe('hold');
    expect(at([hop(20, 'loose', 'after-taking')], [])).toBe('passed');
    expect(at([hop(0.3), hop(0.3)])).toBe('mind');
    expect(at([hop(2, 'bagged'), hop(0.5)], [])).toBe('hold');
  });

  test('unknown hops', () => {
    expect(missingFor(answer(undefined), 'hops-in-cake')).toEqual(['dryHop']);
    const { dryHops: _b, ...later } = paleAle();
    const under = (grams: number) =>
      standing(check({ a: { ...blonde(), dryHops: [hop(grams)] }, b: later }), 'hops-in-cake');
    expect(under(0.5)).toBe('passed');
    expect(under(1)).toBe('mind');
    expect(under(6)).toBe('hold');
  });
});
