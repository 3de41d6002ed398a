import { describe, expect, test } from 'vitest';
import type { YeastFacts } from '#shared/rules/facts.ts';
import { blonde, check, CLEAN_ALE, missingFor, paleAle, standing } from '../../support/links.ts';

const answer = (a: number, b: number, yeast: YeastFacts = CLEAN_ALE) =>
  check({ a: { ...blonde(), fermentC: a }, b: { ...paleAle(), fermentC: b }, yeast });
const at = (...of: Parameters<typeof answer>) =>
  standing(answer(...of), 'fermentation-temperature');
const RULE = 'fermentation-temperature';

describe('fermentation-temperature', () => {
  test.each([
    [18, 22, 'passed'],
    [20, 22.04, 'passed'],
    [20, 22.1, 'mind'],
    [20, 24, 'mind'],
    [20, 24.1, 'hold'],
    [20, 17.9, 'mind'],
    [20, 16, 'mind'],
    [20, 15.9, 'hold'],
    [22.1, 20, 'mind'],
    [35, 20, 'mind'],
    [17.9, 20, 'mind'],
  ])('A at %d, B at %d °C: %s', (a, b, expected) => expect(at(a, b)).toBe(expected));

  test('without a range of its own the kind’s counts', () => {
    expect(at(15, 26, { kind: 'ale' })).toBe('passed');
    expect(at(15, 26.1, { kind: 'ale' })).toBe('mind');
    expect(at(5, 15, { kind: 'lager' })).toBe('passed');
    expect(at(11, 20, { kind: 'lager' })).toBe('hold');
  });

  test('one temperature may decide', () => {
    const { fermentC: _c, ...unknown } = blonde();
    const far = check({ a: unknown, b: { ...paleAle(), fermentC: 30 } });
    expect(standing(far, RULE)).toBe('hold');
    const fine = check({ a: unknown, b: paleAle() });
    expect(missingFor(fine, RULE)).toEqual(['fermentC']);
    const { fermentC: _d, ...later } = paleAle();
    expect(standing(check({ a: { ...blonde(), fermentC: 25 }, b: later }), RULE)).toBe('mind');
  });
});
