import { describe, expect, test } from 'vitest';
import { blonde, checkAsDated, missingFor, paleAle, standing } from '../../support/links.ts';

const answer = (brewOn: string, takenOn?: string) =>
  checkAsDated({
    a: blonde(),
    b: { ...paleAle(), brewOn },
    pour: takenOn === undefined ? {} : { takenOn },
  });

describe('brew-day', () => {
  test.each([
    ['2027-03-19', undefined, 'hold'],
    ['2027-03-20', undefined, 'passed'],
    ['2027-03-21', undefined, 'passed'],
    ['2027-03-16', '2027-03-16', 'passed'],
    ['2027-03-15', '2027-03-16', 'hold'],
  ])('racked on 20 March, brewed on %s, taken on %s: %s', (brewOn, takenOn, expected) =>
    expect(standing(answer(brewOn, takenOn), 'brew-day')).toBe(expected),
  );

  test('a vessel that is not free holds, on the board', () => {
    const link = { a: blonde(), b: { ...paleAle(), brewOn: '2027-03-20' } };
    const taken = checkAsDated({ ...link, rest: { board: { vesselTakenBy: 'Stout' } } });
    expect(standing(taken, 'brew-day')).toBe('hold');
    expect(standing(checkAsDated({ ...link, rest: { board: {} } }), 'brew-day')).toBe('passed');
  });

  test('missing dates are named', () => {
    const { brewOn: _b, daysUnderBeer: _d, ...open } = blonde();
    const { brewOn: _c, ...later } = paleAle();
    expect(missingFor(checkAsDated({ a: open, b: paleAle() }), 'brew-day')).toEqual([
      'brewOn',
      'daysUnderBeer',
    ]);
    expect(missingFor(checkAsDated({ a: blonde(), b: later }), 'brew-day')).toEqual(['brewOn']);
    const taken = checkAsDated({ a: open, b: paleAle(), pour: { takenOn: '2027-03-01' } });
    expect(standing(taken, 'brew-day')).toBe('passed');
  });
});
