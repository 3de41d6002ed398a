import { createHash } from 'node:crypto';
import type { FactChange } from '#shared/record/facts.ts';
import { linkChanges } from '#shared/chain/linkChanges.ts';
import { linkGist } from '#shared/chain/lapses.ts';
import type { BoardNow, Writer } from '../routes/board/hand.ts';
import { writeEntry, type Entry } from '../routes/board/record.ts';
import { differenceOf, type EditSide } from './difference.ts';
import type { Snapshot } from './snapshot.ts';

/** What a command says of what it did; the rows are compared before and after it. */
export interface Said {
  /** Made by the client where a repeated request must be recognised. */
  id?: string;
  /** "Set the bitterness of Keel from 24 to 28 IBU". */
  what: string;
  /** Each fact that changed, for the record page. */
  facts?: readonly FactChange[];
  touches: readonly string[];
  /** It happened, and is not undone. */
  stays?: true;
  /** Where something changed that is no row of the board. */
  before?: unknown;
  after?: unknown;
}

interface Stage {
  board: BoardNow;
  rows: Snapshot;
}

/** Writes an edit, an undo or a redo of one into the change record. Nothing changed: no entry. */
export async function recordEdit(
  { tx, member, now }: Writer,
  said: Said & Pick<Entry, 'ofChange'> & { kind: Entry['kind'] },
  before: Stage,
  after: Stage,
): Promise<void> {
  const { facts, stays, ...entry } = said;
  const difference = differenceOf(before.rows, after.rows);
  if (difference.isEmpty && said.before === undefined && said.after === undefined) return;
  const sides = difference.isEmpty
    ? { before: said.before, after: said.after }
    : {
        before: { ...difference.before, ...accepted(difference.before, before.board) },
        after: {
          ...difference.after,
          ...accepted(difference.after, after.board),
          links: linkChanges(before.board, after.board, member.brewery.units),
          ...(facts && facts.length > 0 && { facts }),
          ...(stays && { stays }),
        },
      };
  const shelves = shelvesOf(difference.touches, before.board, after.board);
  const touches = new Set([...said.touches, ...difference.touches, ...shelves]);
  await writeEntry(tx, member, now, { ...entry, ...sides, touches: [...touches] });
}

/** The shelves of the batches that it touches: the record of a shelf tells of these too. */
function shelvesOf(touches: readonly string[], ...boards: readonly BoardNow[]): string[] {
  const ids = new Set(touches);
  return boards.flatMap(({ batches }) =>
    batches.flatMap(({ id, chainId }) => (ids.has(id) && chainId !== null ? [chainId] : [])),
  );
}

/** What the accepted links of a side were, so that an acceptance comes back to the same link only. */
function accepted({ rows }: EditSide, board: BoardNow): { accepted?: Record<string, string> } {
  const gists = Object.entries(rows.batch ?? {}).flatMap(([id, row]) =>
    row?.acceptance ? [[id, gistOf(board, id)] as const] : [],
  );
  return gists.length === 0 ? {} : { accepted: Object.fromEntries(gists) };
}

export const gistOf = (board: BoardNow, batchId: string): string =>
  createHash('sha256')
    .update(linkGist(board, batchId) ?? '')
    .digest('hex');
