import { formatDay } from '#shared/units/day.ts';
import { dayOf, timeOf } from '../app/zonedTime.ts';

/** How old something is that was read at an instant: "at 14:05", "on Fri 3 April at 14:05". */
export function asOf(readAt: number, now: number = Date.now()): string {
  const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
  const day = dayOf(readAt, timeZone);
  const time = `at ${timeOf(readAt, timeZone)}`;
  return day === dayOf(now, timeZone) ? time : `on ${formatDay(day)} ${time}`;
}
