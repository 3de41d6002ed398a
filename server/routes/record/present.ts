import { z } from 'zod';
import { recordEntry, type RecordEntry } from '#shared/api/record.ts';
import type { change } from '../../db/schema/change.ts';
import { dayIn } from '../../today.ts';
import { WHOM } from '../people/entry.ts';

/** What the record keeps beside the rows. Entries of other kinds have none of it. */
const kept = z.object({
  facts: recordEntry.shape.facts.catch([]).default([]),
  links: recordEntry.shape.links.catch([]).default([]),
});

export interface EntryRow {
  change: typeof change.$inferSelect;
  name: string;
  /** Whom it is about, where it is about somebody. */
  whom?: string | null;
  lastKind: string | null;
}

export function presentEntry(
  { change, name, whom, lastKind }: EntryRow,
  timeZone: string,
): RecordEntry {
  const { id, at, personId, kind, what, touches } = change;
  const { facts, links } = kept.catch({ facts: [], links: [] }).parse(change.after ?? {});
  return {
    id,
    at: at.toISOString(),
    day: dayIn(timeZone, at),
    person: { id: personId, name },
    kind,
    what: !whom ? what : what.replace(WHOM, () => whom),
    facts,
    links,
    touches,
    undone: lastKind === 'undo',
  };
}
