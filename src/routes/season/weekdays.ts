/** ISO weekdays, Monday first. */
export const WEEKDAYS = [
  { day: 1, name: 'Monday' },
  { day: 2, name: 'Tuesday' },
  { day: 3, name: 'Wednesday' },
  { day: 4, name: 'Thursday' },
  { day: 5, name: 'Friday' },
  { day: 6, name: 'Saturday' },
  { day: 7, name: 'Sunday' },
] as const;

export const weekdayWords = (days: readonly number[]): string =>
  WEEKDAYS.filter(({ day }) => days.includes(day))
    .map(({ name }) => name)
    .join(', ') || 'none';
