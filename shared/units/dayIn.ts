import type { Day } from '../rules/vocabulary.ts';

const formats = new Map<string, Intl.DateTimeFormat>();

/**
 * The calendar day of an instant in an IANA time zone, `YYYY-MM-DD`: the day that a calendar on the
 * wall there shows, also on the two days a year on which the clocks change. Throws a RangeError for
 * a zone that is none.
 */
export function dayIn(timeZone: string, at: Date): Day {
  let format = formats.get(timeZone);
  if (!format) {
    format = new Intl.DateTimeFormat('en-CA', {
      timeZone,
      year: 'numeric',
      month: '2-digit',
      day: '2-digit',
    });
    formats.set(timeZone, format);
  }
  return format.format(at);
}
