import type { UnitPrefs } from '../api/units.ts';
import type { LinkAnswer } from '../rules/answer.ts';
import type { Verdict } from '../rules/vocabulary.ts';
import type { BoardFacts } from './board.ts';
import { sightOf, type Sight } from './boardLink.ts';
import { judgeLink } from './checkLink.ts';
import { indexedBoard } from './indexedBoard.ts';
import { judgeBoard } from './judgeBoard.ts';
import { linkInput } from './linkInput.ts';

/** What a link says: its verdict, and the title of the finding that it comes from. */
export interface LinkSaying {
  verdict: Verdict;
  /** Null: nothing speaks against it. */
  reason: string | null;
}

/** A link whose verdict differs between two boards. */
export interface LinkChange {
  /** The later batch of the link. */
  batchId: string;
  name: string;
  /** Null: there was no link, or is none. */
  from: LinkSaying | null;
  to: LinkSaying | null;
}

export const sayingOf = ({ verdict, findings }: LinkAnswer): LinkSaying => ({
  verdict,
  reason: findings.find((finding) => finding.verdict === verdict)?.title ?? null,
});

const sights = new WeakMap<BoardFacts, Sight>();

/** A row of moves asks of each board twice: as it is after one, and before the next. */
function readOnce(board: BoardFacts): Sight {
  const sight = sights.get(board) ?? sightOf(board);
  sights.set(board, sight);
  return sight;
}

/** What the link into a batch says; null where no cake goes under it. */
export function linkSaying(board: BoardFacts, batchId: string): LinkSaying | null {
  const input = linkInput(batchId, readOnce(board));
  if (!input) return null;
  const { verdict, reason } = judgeLink(input);
  return { verdict, reason };
}

/** On the later board, or on the earlier one where it is there no longer. */
const nameOn = (before: BoardFacts, after: BoardFacts, id: string): string =>
  (indexedBoard(after).batch(id) ?? indexedBoard(before).batch(id))?.name ?? '';

/** What the link into one batch said before and says now, whether or not that differs. */
export const linkChange = (before: BoardFacts, after: BoardFacts, batchId: string): LinkChange => ({
  batchId,
  name: nameOn(before, after, batchId),
  from: linkSaying(before, batchId),
  to: linkSaying(after, batchId),
});

/** Links whose verdict or worst reason differs, in the order of the later board's shelves. */
export function linkChanges(
  before: BoardFacts,
  after: BoardFacts,
  units?: UnitPrefs,
): LinkChange[] {
  const [was, is] = [judgeBoard(before, units).links, judgeBoard(after, units).links];
  return [...new Set([...is.keys(), ...was.keys()])].flatMap((batchId) => {
    const [old, now] = [was.get(batchId), is.get(batchId)];
    const from = old ? sayingOf(old) : null;
    const to = now ? sayingOf(now) : null;
    const same = from?.verdict === to?.verdict && from?.reason === to?.reason;
    return same ? [] : [{ batchId, name: nameOn(before, after, batchId), from, to }];
  });
}
