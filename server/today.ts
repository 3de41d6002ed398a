import { dayIn } from '#shared/units/dayIn.ts';

export { dayIn };

const MS_A_DAY = 24 * 60 * 60 * 1000;
const MS_A_MINUTE = 60_000;

/** The first instant after a calendar day of a time zone, whatever the clocks did on it. */
export function endOfDayIn(timeZone: string, day: string): Date {
  const midnight = Date.parse(`${day}T00:00:00Z`) + MS_A_DAY;
  // No zone is further than 14 hours from UTC: the end lies between, and days only go up.
  let before = midnight - MS_A_DAY;
  let after = midnight + MS_A_DAY;
  while (after - before > MS_A_MINUTE) {
    const middle = before + Math.floor((after - before) / 2 / MS_A_MINUTE) * MS_A_MINUTE;
    if (dayIn(timeZone, new Date(middle)) > day) after = middle;
    else before = middle;
  }
  return new Date(after);
}
