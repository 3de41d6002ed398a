import type { RecordEntry } from '#shared/api/record.ts';

/** Entries under the days on which they happened, as they come. */
export function byDay(entries: readonly RecordEntry[]): { day: string; entries: RecordEntry[] }[] {
  const days: { day: string; entries: RecordEntry[] }[] = [];
  for (const entry of entries) {
    const last = days.at(-1);
    if (last?.day === entry.day) last.entries.push(entry);
    else days.push({ day: entry.day, entries: [entry] });
  }
  return days;
}
