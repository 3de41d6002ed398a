import { formatDay } from '#shared/units/day.ts';

/** The moment a link ends, in the brewery's time zone: "Tue 8 December, 16:05". */
export function endOf(instant: string, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-CA', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
    hour: '2-digit',
    minute: '2-digit',
    hourCycle: 'h23',
  }).formatToParts(new Date(instant));
  const get = (type: Intl.DateTimeFormatPartTypes) =>
    parts.find((part) => part.type === type)?.value ?? '';
  return `${formatDay(`${get('year')}-${get('month')}-${get('day')}`)}, ${get('hour')}:${get('minute')}`;
}
