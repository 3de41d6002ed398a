import type { PourClearance, PourRun, WortReading } from '../api/pour.ts';

/** The newest reading that counts, up to a moment in milliseconds since 1970. */
export const newestReading = (
  run: Pick<PourRun, 'readings'>,
  at: number,
): WortReading | undefined =>
  run.readings.findLast((one) => !one.withdrawn && Date.parse(one.at) <= at);

/**
 * The leave that holds at a moment, or null: of the newest reading, or a head brewer's. A temperature
 * that kills ends every leave.
 */
export function leaveAt(run: PourRun, at: number, kills: boolean): PourClearance | null {
  const newest = newestReading(run, at);
  const holds = ({ kind, answer, answeredAt, expiresAt, readingId }: PourClearance): boolean => {
    if (answer !== 'granted' || answeredAt === null || expiresAt === null) return false;
    if (at > Date.parse(expiresAt)) return false;
    if (kind === 'reading') return newest !== undefined && newest.id === readingId;
    return !kills && Date.parse(answeredAt) <= at;
  };
  return run.clearances.findLast(holds) ?? null;
}

/** An override that was asked and not answered yet, or null. */
export const askedOverride = (run: Pick<PourRun, 'clearances'>): PourClearance | null =>
  run.clearances.findLast(({ kind, answer }) => kind === 'override' && answer === null) ?? null;
