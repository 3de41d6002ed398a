import type { Day } from '../rules/vocabulary.ts';

/** Arithmetic on calendar days, `YYYY-MM-DD`. No clock and no time zone takes part in it. */

const DAY_MS = 86_400_000;
const DAY = /^\d{4}-\d{2}-\d{2}$/;
const WEEKDAYS = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'] as const;
const MONTHS = [
  'January',
  'February',
  'March',
  'April',
  'May',
  'June',
  'July',
  'August',
  'September',
  'October',
  'November',
  'December',
] as const;

/**
 * Days are few and asked for again and again (a season's board asks thousands of times): each is
 * worked out once. Dropped when there are too many, so that no odd input fills the memory.
 */
const MOST_DAYS = 20_000;
const numbers = new Map<Day, number>();
const days = new Map<number, Day>();

function remember<K, V>(known: Map<K, V>, key: K, value: V): V {
  if (known.size >= MOST_DAYS) known.clear();
  known.set(key, value);
  return value;
}

/** Days since 1 January 1970. Throws a RangeError where the text is not written as a day. */
export function dayNumber(day: Day): number {
  return numbers.get(day) ?? remember(numbers, day, countDays(day));
}

function countDays(day: Day): number {
  if (!DAY.test(day)) throw new RangeError(`Not a day: ${day}`);
  const number = Date.UTC(
    Number(day.slice(0, 4)),
    Number(day.slice(5, 7)) - 1,
    Number(day.slice(8, 10)),
  );
  return number / DAY_MS;
}

/** The day that is so many days after 1 January 1970. */
export const dayOf = (number: number): Day =>
  days.get(number) ?? remember(days, number, new Date(number * DAY_MS).toISOString().slice(0, 10));

/** The day n days later; n may be negative. */
export const addDays = (day: Day, n: number): Day => dayOf(dayNumber(day) + n);

/** Days from a to b; negative where b comes first. */
export const daysBetween = (a: Day, b: Day): number => dayNumber(b) - dayNumber(a);

/** ISO weekday: 1 = Monday … 7 = Sunday. */
export const weekday = (day: Day): number => ((((dayNumber(day) + 3) % 7) + 7) % 7) + 1;

const dayOfMonth = (day: Day): number => Number(day.slice(8, 10));
const month = (day: Day): string => MONTHS[Number(day.slice(5, 7)) - 1] ?? '';

/** "Fri 3 April". */
export const formatDay = (day: Day): string =>
  `${WEEKDAYS[weekday(day) - 1] ?? ''} ${dayOfMonth(day)} ${month(day)}`;

/** "3 Apr". */
export const formatDayShort = (day: Day): string => `${dayOfMonth(day)} ${month(day).slice(0, 3)}`;
