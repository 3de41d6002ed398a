import { isRecord } from '../app/isRecord.ts';
import type { Entry, Outcome, Refusal } from './entry.ts';

/** The outbox as plain data: entries in the order in which they were written, oldest first. */
export type Entries = readonly Entry[];

export const ofPerson = (entries: Entries, personId: string | null): Entries =>
  entries.filter((entry) => entry.personId === personId);

/** What is sent next for a person; null: nothing, or the oldest was refused and all wait behind it. */
export function nextOf(entries: Entries, personId: string | null): Entry | null {
  const first = ofPerson(entries, personId)[0];
  return first && first.refusal === null ? first : null;
}

/** One more; an id that is in already stays as it is. */
export const withNew = (entries: Entries, entry: Entry): Entries =>
  entries.some(({ id }) => id === entry.id) ? entries : [...entries, entry];

export const without = (entries: Entries, id: string): Entries =>
  entries.filter((entry) => entry.id !== id);

/** The entries once one of them was sent. */
export function afterSending(entries: Entries, sent: Entry, outcome: Outcome): Entries {
  switch (outcome.kind) {
    case 'done':
      return rebased(without(entries, sent.id), sent, outcome.answer);
    case 'refused':
      return alreadyThere(sent, outcome.refusal)
        ? rebased(without(entries, sent.id), sent, outcome.refusal.current)
        : replaced(entries, { ...sent, refusal: outcome.refusal });
    case 'lost':
    case 'later':
      return entries;
  }
}

const replaced = (entries: Entries, next: Entry): Entries =>
  entries.map((entry) => (entry.id === next.id ? next : entry));

/**
 * What was written later on the same row was made from the version that this one has now changed:
 * it follows on, since nobody else came between.
 */
function rebased(entries: Entries, sent: Entry, answer: unknown): Entries {
  const version = versionIn(answer);
  if (version === null) return entries;
  const rowUrl = sent.method === 'POST' ? `${pathOf(sent.url)}/${sent.id}` : pathOf(sent.url);
  const before = sent.ifMatch ?? version;
  return entries.map((entry) =>
    pathOf(entry.url) === rowUrl && entry.ifMatch === before
      ? { ...entry, ifMatch: version }
      : entry,
  );
}

/** Without the season that it was written in: the row is the same at each of its addresses. */
export const pathOf = (url: string) => url.split('?')[0] ?? url;

/**
 * A refusal that only says that it was done before: the answer of the first time was lost. A row
 * that is to go has gone; a row that is to be changed has everything that was to be in it.
 */
function alreadyThere(entry: Entry, { status, current }: Refusal): boolean {
  if (entry.method === 'DELETE') return status === 404;
  return status === 412 && contains(current, entry.body);
}

function contains(row: unknown, part: unknown): boolean {
  if (!isRecord(row) || !isRecord(part)) return false;
  return Object.entries(part).every(([key, value]) => sameValue(row[key], value));
}

function sameValue(a: unknown, b: unknown): boolean {
  if (Array.isArray(a) && Array.isArray(b))
    return a.length === b.length && a.every((one, at) => sameValue(one, b[at]));
  if (isRecord(a) && isRecord(b)) {
    const keys = new Set([...Object.keys(a), ...Object.keys(b)]);
    return [...keys].every((key) => sameValue(a[key], b[key]));
  }
  return a === b;
}

const versionIn = (answer: unknown): number | null =>
  isRecord(answer) && typeof answer.version === 'number' ? answer.version : null;

/**
 * A refused entry is tried again: as it was, or, where somebody changed the row in the meantime and
 * one's own shall stand, from the version that is there now.
 */
export function tryAgain(entries: Entries, id: string, from: 'as-it-was' | 'over-theirs'): Entries {
  return entries.map((entry) => {
    if (entry.id !== id) return entry;
    const version = from === 'over-theirs' ? versionIn(entry.refusal?.current) : null;
    return { ...entry, refusal: null, ...(version !== null && { ifMatch: version }) };
  });
}
