import { expect, test } from 'vitest';
import { addDays, daysBetween, formatDay, formatDayShort, weekday } from '#shared/units/day.ts';

test('days are added across months, years and leap days', () => {
  expect(addDays('2027-03-06', 14)).toBe('2027-03-20');
  expect(addDays('2027-12-31', 1)).toBe('2028-01-01');
  expect(addDays('2028-02-28', 1)).toBe('2028-02-29');
  expect(addDays('2100-02-28', 1)).toBe('2100-03-01');
  expect(addDays('2027-03-01', -1)).toBe('2027-02-28');
});

test('days between run from the first to the second, over a change to summer time', () => {
  expect(daysBetween('2027-03-27', '2027-03-29')).toBe(2);
  expect(daysBetween('2027-03-29', '2027-03-27')).toBe(-2);
  expect(daysBetween('2027-01-01', '2028-01-01')).toBe(365);
});

test('weekdays are ISO weekdays, before 1970 too', () => {
  expect(weekday('1969-07-20')).toBe(7);
  expect(weekday('2000-01-01')).toBe(6);
  expect(weekday('2026-04-03')).toBe(5);
  expect(weekday('2027-03-08')).toBe(1);
});

test('days read as a brewer reads them', () => {
  expect(formatDay('2026-04-03')).toBe('Fri 3 April');
  expect(formatDay('2027-09-30')).toBe('Thu 30 September');
  expect(formatDayShort('2026-04-03')).toBe('3 Apr');
});

test('what is no day is refused', () => {
  expect(() => addDays('soon', 1)).toThrow(RangeError);
  expect(() => weekday('')).toThrow(RangeError);
});
