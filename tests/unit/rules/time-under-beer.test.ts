import { describe, expect, test } from 'vitest';
import {
  ale,
  check,
  checkAsDated,
  lager,
  missingFor,
  PALE_LAGER,
  paleAle,
  standing,
} from '../../support/links.ts';

const RULE = 'time-under-beer';
const aleFor = (daysUnderBeer: number, og = 1.05) =>
  standing(check({ a: { ...ale('a', og, 6, 25), daysUnderBeer }, b: ale('b', og, 6, 25) }), RULE);
const lagerFor = (daysUnderBeer: number) =>
  standing(
    check({
      a: { ...lager('a', 1.05, 4, 25), daysUnderBeer },
      b: lager('b', 1.05, 4, 25),
      yeast: PALE_LAGER,
    }),
    RULE,
  );

describe('time-under-beer', () => {
  test.each([
    [4, 'mind'],
    [5, 'passed'],
    [28, 'passed'],
    [29, 'mind'],
    [60, 'mind'],
    [61, 'hold'],
  ])('an ale for %d days: %s', (days, expected) => expect(aleFor(days)).toBe(expected));

  test.each([
    [9, 'mind'],
    [10, 'passed'],
    [60, 'passed'],
    [61, 'mind'],
    [120, 'mind'],
    [121, 'hold'],
  ])('a lager for %d days: %s', (days, expected) => expect(lagerFor(days)).toBe(expected));

  test('above 7 % ABV 21 days are enough', () => {
    // 1.070 to a quarter of its points holds about 7.1 % ABV, 1.068 about 6.9 %.
    expect(aleFor(21, 1.07)).toBe('passed');
    expect(aleFor(22, 1.07)).toBe('mind');
    expect(aleFor(22, 1.068)).toBe('passed');
  });

  test('yeast taken on a day of its own counts until that day', () => {
    const a = ale('a', 1.05, 6, 25);
    const taken = (takenOn: string) =>
      standing(checkAsDated({ a, b: paleAle(), pour: { takenOn } }), RULE);
    expect(taken('2027-03-10')).toBe('mind');
    expect(taken('2027-03-11')).toBe('passed');
  });

  test('missing facts are named, where they could decide', () => {
    const { daysUnderBeer: _d, ...open } = ale('a', 1.05, 6, 25);
    expect(missingFor(check({ a: open, b: paleAle() }), RULE)).toEqual(['daysUnderBeer']);
    const { fg: _f, ...unfinished } = ale('a', 1.05, 6, 25);
    const for22 = check({ a: { ...unfinished, daysUnderBeer: 22 }, b: paleAle() });
    expect(missingFor(for22, RULE)).toEqual(['fg']);
    const for21 = check({ a: { ...unfinished, daysUnderBeer: 21 }, b: paleAle() });
    expect(standing(for21, RULE)).toBe('passed');
  });
});
