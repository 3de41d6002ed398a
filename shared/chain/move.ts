import type { Batch } from '../api/batch.ts';
import type { Chain } from '../api/chain.ts';
import type { MoveRequest, ShiftedDate } from '../api/move.ts';
import { isPencilled, type BoardFacts, type BoardIndex } from './board.ts';
import { shiftedDates } from './dates.ts';
import { indexedBoard } from './indexedBoard.ts';
import { lapses } from './lapses.ts';
import { asLastShelf } from './newShelf.ts';
import { isSettled, lockOf, planMove, withoutBatch, type Plan, type Target } from './plan.ts';
import { renumbered } from './places.ts';

export type MoveWish = Pick<
  MoveRequest,
  'batchId' | 'toChainId' | 'afterBatchId' | 'expectedChainId' | 'dates' | 'newChain'
>;

export type MoveRefusal = 'not-found' | 'moved-elsewhere' | 'place-taken' | 'locked' | 'own-branch';

export type MoveResult =
  | {
      ok: true;
      /** Changed rows only, with their new places. Versions are as they were. */
      batches: Batch[];
      /** The chain that the move made, if any. */
      chains: Chain[];
      shifted: ShiftedDate[];
      /** Batches whose kept part, other link facts or acceptance went. */
      cleared: string[];
      what: string;
    }
  | { ok: false; why: MoveRefusal; detail: string };

const refuse = (why: MoveRefusal, detail: string): MoveResult => ({ ok: false, why, detail });

/**
 * Moves one batch, order and dates together; the one move for pages and server. Pure: gives back
 * the rows that change. A wish that already stands is granted and changes nothing.
 */
export function moveBatch(board: BoardFacts, wish: MoveWish): MoveResult {
  const index = indexedBoard(board);
  const batch = index.batch(wish.batchId);
  if (!batch) return refuse('not-found', 'This batch is no longer on the board.');
  const target = targetOf(index, wish);
  if (!target) return refuse('not-found', 'That shelf is no longer on the board.');
  const what = describe(index, batch, target);
  if (stands(index, batch, target))
    return { ok: true, batches: [], chains: [], shifted: [], cleared: [], what };
  return refusal(index, batch, target, wish) ?? carryOut(index, batch, target, wish, what);
}

function targetOf(index: BoardIndex, wish: MoveWish): Target | null {
  const afterId = wish.afterBatchId;
  if (wish.toChainId === 'bench') return { chainId: null, afterId, added: null };
  if (wish.toChainId !== 'new')
    return index.chain(wish.toChainId) ? { chainId: wish.toChainId, afterId, added: null } : null;
  if (!wish.newChain) return null;
  const { id } = wish.newChain;
  const added = index.chain(id) ? null : asLastShelf(index, wish.newChain);
  return { chainId: id, afterId: null, added };
}

const matesAt = (index: BoardIndex, chainId: string | null): readonly Batch[] =>
  chainId === null ? index.bench : index.batchesOf(chainId);

/** True where the batch already stands where it is wished. */
function stands(index: BoardIndex, batch: Batch, target: Target): boolean {
  if (batch.stage === 'scrapped' || batch.chainId !== target.chainId || target.added) return false;
  const mates = matesAt(index, target.chainId);
  const at = mates.findIndex((mate) => mate.id === batch.id);
  return target.afterId === batch.id || (mates[at - 1]?.id ?? null) === target.afterId;
}

function refusal(
  index: BoardIndex,
  batch: Batch,
  target: Target,
  wish: MoveWish,
): MoveResult | null {
  if (!isPencilled(batch))
    return refuse('locked', `${batch.name} is ${batch.stage}, so it stays where it is.`);
  if (batch.chainId !== wish.expectedChainId)
    return refuse('moved-elsewhere', `${batch.name} is now ${whereabouts(index, batch)}.`);
  const mates = matesAt(index, target.chainId);
  if (target.afterId !== null && !mates.some((mate) => mate.id === target.afterId))
    return refuse(
      'place-taken',
      'The batch it should come after has moved. Look and choose again.',
    );
  const start = target.added?.start;
  if (start?.kind === 'cake' && !isLive(index, start.batchId))
    return refuse('not-found', 'The batch whose cake should start this shelf is not on the board.');
  const lock = lockOf(index, batch, target);
  if (lock === 'poured')
    return refuse(
      'locked',
      'A batch further along there is already poured, so this place is closed.',
    );
  if (lock === 'own-branch')
    return refuse('own-branch', `That shelf comes of the cake of ${batch.name}.`);
  return null;
}

const isLive = (index: BoardIndex, id: string): boolean => {
  const batch = index.batch(id);
  return batch !== undefined && batch.stage !== 'scrapped';
};

function carryOut(
  index: BoardIndex,
  batch: Batch,
  target: Target,
  wish: MoveWish,
  what: string,
): MoveResult {
  const plan = planMove(index, batch, target, wish.dates);
  const rows = renumbered(
    index,
    plan.draft,
    [batch.chainId, target.chainId],
    benchOrder(index, batch, target),
  );
  const chains = target.added ? [target.added] : [];
  const lapsed = new Set(lapses(index.board, withRows(index.board, rows, chains)));
  const batches = rows.map((row) =>
    lapsed.has(row.id) ? { ...row, link: { ...row.link, acceptance: null } } : row,
  );
  return {
    ok: true,
    batches: [...batches, ...lapsedElsewhere(index, batches, lapsed)],
    chains,
    shifted: shiftedDates(index, batches),
    cleared: clearedBy(index, plan, lapsed),
    what,
  };
}

function benchOrder(index: BoardIndex, batch: Batch, { chainId, afterId }: Target): Batch[] {
  const rest = withoutBatch(index.bench, batch.id);
  if (chainId !== null) return rest;
  const place = afterId === null ? 0 : rest.findIndex((mate) => mate.id === afterId) + 1;
  return [...rest.slice(0, place), batch, ...rest.slice(place)];
}

/** A board with some rows replaced and chains added. */
export function withRows(
  board: BoardFacts,
  rows: readonly Batch[],
  chains: readonly Chain[] = [],
): BoardFacts {
  const changed = new Map(rows.map((row) => [row.id, row]));
  return {
    ...board,
    chains: [...board.chains, ...chains],
    batches: board.batches.map((row) => changed.get(row.id) ?? row),
  };
}

/** Rows that change only because an acceptance of theirs lapsed. */
function lapsedElsewhere(index: BoardIndex, rows: readonly Batch[], lapsed: ReadonlySet<string>) {
  const done = new Set(rows.map((row) => row.id));
  return [...lapsed].flatMap((id) => {
    const row = done.has(id) ? undefined : index.batch(id);
    return row ? [{ ...row, link: { ...row.link, acceptance: null } }] : [];
  });
}

function clearedBy(index: BoardIndex, plan: Plan, lapsed: ReadonlySet<string>): string[] {
  const broken = plan.relinked.filter((id) => {
    const before = index.batch(id);
    return before !== undefined && isSettled(before);
  });
  return [...new Set([...broken, ...lapsed])];
}

function whereabouts(index: BoardIndex, batch: Batch): string {
  if (batch.chainId === null) return 'on the bench';
  return `on the shelf ${index.chain(batch.chainId)?.name ?? ''}`.trimEnd();
}

/** The move in words, for the history and the undo button. */
function describe(index: BoardIndex, batch: Batch, target: Target): string {
  if (target.chainId === null) return `Put ${batch.name} on the bench`;
  if (target.added) return `Moved ${batch.name} to a new shelf, ${target.added.name}`;
  const after = target.afterId === null ? undefined : index.batch(target.afterId);
  if (after) return `Moved ${batch.name} after ${after.name}`;
  return `Moved ${batch.name} to the start of ${index.chain(target.chainId)?.name ?? 'the shelf'}`;
}
