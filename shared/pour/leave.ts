import type { PourClearance, PourRun, WortReading } from '../api/pour.ts';

/** The newest reading that counts, up to a moment in milliseconds since 1970. */
export const newestReading = (
  run: Pick<PourRun, 'readings'>,
  at: number,
): WortReading | undefined =>
  run.readings.findLast((one) => !one.withdrawn && Date.parse(one.at) <= at);

/**
 * The leave that holds at a moment, or null: of the newest reading, or a head brewer's.
 * @param ended whether something holds that ends every leave (`endsLeave`).
 */
export function leaveAt(
  run: Pick<PourRun, 'readings' | 'clearances'>,
  at: number,
  ended: boolean,
): PourClearance | null {
  if (ended) return null;
  const newest = newestReading(run, at);
  const holds = ({ kind, answer, answeredAt, expiresAt, readingId }: PourClearance): boolean => {
    if (answer !== 'granted' || answeredAt === null || expiresAt === null) return false;
    if (at > Date.parse(expiresAt)) return false;
    if (kind === 'reading') return newest !== undefined && newest.id === readingId;
    return Date.parse(answeredAt) <= at;
  };
  return run.clearances.findLast(holds) ?? null;
}

/** An override that was asked and not answered yet, or null. */
export const askedOverride = (run: Pick<PourRun, 'clearances'>): PourClearance | null =>
  run.clearances.findLast(({ kind, answer }) => kind === 'override' && answer === null) ?? null;
