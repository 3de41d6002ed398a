import { describe, expect, it } from 'vitest';
import { seasonShift, shiftToStart } from '#shared/chain/seasonShift.ts';

/** Saturdays, by the calendar: 6, 13 and 27 March 2027. */
const SATURDAYS = ['2027-03-06', '2027-03-13', '2027-03-27'];
const SATURDAY = 6;
const SUNDAY = 7;
const WEDNESDAY = 3;

describe('a season is shifted', () => {
  it.each([
    ['to whole weeks where the brew days ask for it', SATURDAYS, 180, [SATURDAY], 182],
    ['also backwards', SATURDAYS, -30, [SATURDAY], -28],
    ['as wished where every day lands on a brew day', SATURDAYS, 183, [SATURDAY, SUNDAY], 183],
    ['as wished where no weekday is set', SATURDAYS, 180, [], 180],
    ['to other brew days of the new season', SATURDAYS, 182, [WEDNESDAY], 179],
    ['by whole weeks as they are', SATURDAYS, 364, [SATURDAY], 364],
    ['as wished where nothing has a day', [], 10, [SATURDAY], 10],
  ])('%s', (_, days, wished, weekdays, shift) => {
    expect(seasonShift(days, wished, weekdays)).toBe(shift);
  });

  it('so that the most brew days fit: one Sunday among Saturdays gives way', () => {
    expect(seasonShift([...SATURDAYS, '2027-03-21'], 1, [SATURDAY])).toBe(0);
  });

  it('over a leap day and the end of a year', () => {
    // 6 March 2027 and 4 March 2028 are Saturdays, 364 days apart.
    expect(seasonShift(['2027-03-06'], 365, [SATURDAY])).toBe(364);
  });
});

it('begins on the day that is asked for', () => {
  expect(shiftToStart(['2027-03-13', '2027-03-06'], '2027-09-04')).toBe(182);
  expect(shiftToStart([], '2027-09-04')).toBe(0);
});
