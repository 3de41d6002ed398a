/** The calendar day so many days from today, before it where negative. */
export const dayFromToday = (days: number, today = new Date()): string =>
  new Date(today.getTime() + days * 86_400_000).toISOString().slice(0, 10);
