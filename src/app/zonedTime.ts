import { formatDay } from '#shared/units/day.ts';
import { dayIn } from '#shared/units/dayIn.ts';

/** Instants as a brewery's clock shows them. */

/** ISO 8601, or ms since 1970. */
type Instant = string | number;

const formats = new Map<string, Intl.DateTimeFormat>();

function partsIn(timeZone: string, at: Date): string {
  let format = formats.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('sv-SE', {
      timeZone,
      dateStyle: 'short',
      timeStyle: 'medium',
    });
    formats.set(timeZone, format);
  }
  return format.format(at);
}

/** `2027-03-20T14:05`, as a date and time field wants it. */
export const toLocal = (at: Instant, timeZone: string): string =>
  partsIn(timeZone, new Date(at)).replace(' ', 'T').slice(0, 16);

/** The instant that a brewery's clock shows so; null where the text is no time. */
export function fromLocal(text: string, timeZone: string): string | null {
  const wanted = Date.parse(`${text}Z`);
  if (!/^\d{4}-\d\d-\d\dT\d\d:\d\d(:\d\d)?$/.test(text) || Number.isNaN(wanted)) return null;
  // The clock is off by its zone; a second look gets the hours around a change to summer time right.
  let at = wanted;
  for (let look = 0; look < 2; look += 1) at += wanted - asIfUtc(at, timeZone);
  return new Date(at).toISOString();
}

const asIfUtc = (at: number, timeZone: string): number =>
  Date.parse(`${partsIn(timeZone, new Date(at)).replace(' ', 'T')}Z`);

/** The clock's day, `YYYY-MM-DD`, and its time, `14:05`. */
export const dayOf = (at: Instant, timeZone: string): string => dayIn(timeZone, new Date(at));
export const timeOf = (at: Instant, timeZone: string): string => toLocal(at, timeZone).slice(11);

/** "Tue 8 December, 16:05". */
export const dayAndTime = (at: Instant, timeZone: string): string =>
  `${formatDay(dayOf(at, timeZone))}, ${timeOf(at, timeZone)}`;
