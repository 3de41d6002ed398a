import { describe, expect, test } from 'vitest';
import { dayOf, fromLocal, timeOf, toLocal } from '../../../src/app/zonedTime.ts';

describe('a brewery’s clock', () => {
  test.each([
    ['Europe/London', '2027-01-10T09:30', '2027-01-10T09:30:00.000Z'],
    ['Europe/London', '2027-07-10T09:30', '2027-07-10T08:30:00.000Z'],
    ['America/Los_Angeles', '2027-01-10T09:30', '2027-01-10T17:30:00.000Z'],
    ['Asia/Kolkata', '2027-01-10T00:05', '2027-01-09T18:35:00.000Z'],
    // Clocks in London go forward at 1:00 on 28 March 2027, and back at 2:00 on 31 October.
    ['Europe/London', '2027-03-28T00:59', '2027-03-28T00:59:00.000Z'],
    ['Europe/London', '2027-03-28T02:01', '2027-03-28T01:01:00.000Z'],
    ['Europe/London', '2027-10-31T03:00', '2027-10-31T03:00:00.000Z'],
  ])('%s %s is %s, and back', (zone, local, iso) => {
    expect(fromLocal(local, zone)).toBe(iso);
    expect(toLocal(iso, zone)).toBe(local);
  });

  test('what is no time is none', () => {
    expect(fromLocal('', 'Europe/London')).toBeNull();
    expect(fromLocal('2027-02-30', 'Europe/London')).toBeNull();
  });

  test('its day and its time', () => {
    const iso = '2027-07-10T23:30:00.000Z';
    expect([dayOf(iso, 'Europe/London'), timeOf(iso, 'Europe/London')]).toEqual([
      '2027-07-11',
      '00:30',
    ]);
  });
});
