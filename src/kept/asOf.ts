import { formatDay } from '#shared/units/day.ts';

const two = (number: number) => String(number).padStart(2, '0');
const dayOf = (at: Date) => `${at.getFullYear()}-${two(at.getMonth() + 1)}-${two(at.getDate())}`;

/** How old something is that was read at an instant: "at 14:05", "on Fri 3 April at 14:05". */
export function asOf(readAt: number, now: number = Date.now()): string {
  const then = new Date(readAt);
  const time = `at ${two(then.getHours())}:${two(then.getMinutes())}`;
  return dayOf(then) === dayOf(new Date(now)) ? time : `on ${formatDay(dayOf(then))} ${time}`;
}
