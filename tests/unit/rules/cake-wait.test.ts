import { describe, expect, test } from 'vitest';
import { addDays } from '#shared/units/day.ts';
import type { BatchFacts, PourFacts } from '#shared/rules/facts.ts';
import { blonde, checkAsDated, missingFor, paleAle, standing } from '../../support/links.ts';

const answer = (wait: number, pour: PourFacts = {}, a: BatchFacts = blonde()) =>
  checkAsDated({ a, b: { ...paleAle(), brewOn: addDays('2027-03-20', wait) }, pour });
const at = (...of: Parameters<typeof answer>) => standing(answer(...of), 'cake-wait');

describe('cake-wait', () => {
  // Shares that outlive the wait, by hand from ln k = −4.319 + 0.107 T: 20 °C 0.893, 0.798, 0.712,
  // 0.636; 4 °C after 6 and 7 days 0.885 and 0.867, after 17 and 18 days 0.707 and 0.692.
  test.each([
    [-3, 20, 'passed'],
    [0, 20, 'passed'],
    [1, 20, 'passed'],
    [2, 20, 'mind'],
    [3, 20, 'mind'],
    [4, 20, 'hold'],
    [6, 4, 'passed'],
    [7, 4, 'mind'],
    [17, 4, 'mind'],
    [18, 4, 'hold'],
  ])('%d days at %d °C: %s', (wait, cakeC, expected) => expect(at(wait, { cakeC })).toBe(expected));

  test('more than 3 days above 12 °C is a hold whatever survives', () => {
    expect(at(4, { cakeC: 12 })).toBe('mind');
    expect(at(4, { cakeC: 12.04 })).toBe('mind');
    expect(at(4, { cakeC: 12.1 })).toBe('hold');
    expect(at(3, { cakeC: 12.1 })).toBe('mind');
  });

  test('a starter makes a mind of the hold, and nothing of a pour', () => {
    expect(at(9, { cakeC: 20, starter: true })).toBe('mind');
    expect(at(1, { cakeC: 20, starter: true })).toBe('passed');
  });

  test('a bare cake waits where it fermented, a crop in the cold', () => {
    expect(at(2)).toBe('mind');
    expect(at(-2, { takenOn: '2027-03-16' })).toBe('passed');
    expect(at(-2, { takenOn: '2027-03-16', cakeC: 20 })).toBe('mind');
    expect(at(2, { takenOn: '2027-03-20' })).toBe('mind');
  });

  test('a crop or a bare cake, if the racking day is unknown', () => {
    const { daysUnderBeer: _d, ...open } = blonde();
    const link = answer(-2, { takenOn: '2027-03-16' }, open);
    expect(missingFor(link, 'cake-wait')).toEqual(['daysUnderBeer']);
  });

  test('an unknown temperature matters only where the cake waits', () => {
    const { fermentC: _c, ...open } = blonde();
    expect(at(0, {}, open)).toBe('passed');
    expect(missingFor(answer(1, {}, open), 'cake-wait')).toEqual(['fermentC']);
  });
});
