import type { RecordEntry } from '#shared/api/record.ts';
import type { LinkSaying } from '#shared/chain/linkChanges.ts';

export interface LinkTold {
  batchId: string;
  words: string;
  /** Absent where what it was before does not matter: a move makes another link. */
  from: LinkSaying | null;
  to: LinkSaying | null;
}

/** More are counted in the last line's words. */
const TOLD = 6;

/** What the links of a change said: of a move the one that it made, of an edit each that changed. */
export function linksTold({ kind, links }: RecordEntry): LinkTold[] {
  if (kind === 'move')
    return links
      .filter(({ to }) => to !== null)
      .map(({ batchId, name, to }) => ({
        batchId,
        words: `The cake under ${name} then said`,
        from: null,
        to,
      }));
  return links.slice(0, TOLD).map(({ batchId, name, from, to }) => ({
    batchId,
    words: `Cake under ${name}:`,
    from,
    to,
  }));
}
