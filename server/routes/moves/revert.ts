import { isDeepStrictEqual } from 'node:util';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { indexBoard, isPencilled, type BoardFacts, type BoardIndex } from '#shared/chain/board.ts';
import { withRows } from '#shared/chain/move.ts';
import { lapses } from '#shared/chain/lapses.ts';
import { standingsOf, type Side, type Standing } from './standing.ts';

export type Reverted =
  | { ok: true; rows: Batch[]; added: Chain | null; removedChainId: string | null }
  | {
      ok: false;
      /** A sentence for the person who asked. */
      detail: string;
      /** The row that somebody changed since. */
      touched: string | null;
    };

/**
 * The board with one move taken back: every batch of it stands, with its date and its link, as on
 * the other side. Refused where one of these was changed since, or where a batch that came later
 * would lose the cake it stands on.
 */
export function revert(board: BoardFacts, from: Side, to: Side): Reverted {
  const refusal = changedSince(board, from, to);
  if (refusal) return refusal;
  const added = to.chain && asShelf(board, to.chain);
  const base = added ? { ...board, chains: [...board.chains, added] } : board;
  const placed = place(base, from, to);
  if (!placed.ok) return placed;
  const rows = withoutLapsed(base, placed.rows, to);
  const strange = strangers(base, withRows(base, rows), from);
  if (strange)
    return { ok: false, detail: `${strange.name} stands there since`, touched: strange.id };
  const emptied = from.chain?.id ?? null;
  const left = emptied && stillUsed(withRows(base, rows), emptied);
  if (left) return { ok: false, detail: `The shelf is in use by ${left} since`, touched: emptied };
  return { ok: true, rows, added, removedChainId: emptied };
}

/** The shelf as it was, at its place if that is free, else last. */
function asShelf(board: BoardFacts, chain: Chain): Chain {
  const positions = board.chains.map(({ position }) => position);
  const free = !positions.includes(chain.position);
  return free ? chain : { ...chain, position: Math.max(...positions) + 1 };
}

type Refused = Extract<Reverted, { ok: false }>;

const refuse = (detail: string, touched: string | null): Refused => ({
  ok: false,
  detail,
  touched,
});

function changedSince(board: BoardFacts, from: Side, to: Side): Refused | null {
  const index = indexBoard(board);
  const now = standingsOf(board);
  for (const was of from.batches) {
    const batch = index.batch(was.id);
    const is = now.get(was.id);
    if (!batch || !is) return refuse('A batch of it is no longer on the board', was.id);
    if (!isPencilled(batch)) return refuse(`${batch.name} is ${batch.stage} by now`, was.id);
    if (!isDeepStrictEqual(is, was))
      return refuse(`${batch.name} was moved or changed since`, was.id);
  }
  if (from.chain) {
    const shelf = index.chain(from.chain.id);
    if (!shelf) return refuse('The shelf is no longer there', from.chain.id);
    if (shelf.version !== from.chain.version)
      return refuse(`The shelf ${shelf.name} was changed since`, shelf.id);
  }
  for (const { chainId } of to.batches)
    if (chainId !== null && chainId !== to.chain?.id && !index.chain(chainId))
      return refuse('The shelf is no longer there', chainId);
  return null;
}

type Placed = { ok: true; rows: Batch[] } | Refused;

/** Takes the batches that change shelf or row out, and puts each back after its own neighbour. */
function place(board: BoardFacts, from: Side, to: Side): Placed {
  const index = indexBoard(board);
  const orders = new Map<string | null, string[]>();
  const orderOn = (chainId: string | null) => {
    const known = orders.get(chainId);
    if (known) return known;
    const made = matesAt(index, chainId).map(({ id }) => id);
    orders.set(chainId, made);
    return made;
  };
  const [source, target] = [from.batches[0], to.batches[0]];
  if (!source || !target) return refuse('There is nothing to take back', null);
  orders.set(
    source.chainId,
    orderOn(source.chainId).filter((id) => id !== target.id),
  );
  const order = orderOn(target.chainId);
  const at = target.chainId === null ? onBench(order, to) : onShelf(order, target);
  if (at === null) return refuse('The batch before it is no longer on that shelf', target.afterId);
  if (target.chainId !== null && order.slice(at).some((id) => isPoured(index, id)))
    return refuse('A batch further along is poured by now', target.id);
  orders.set(target.chainId, [...order.slice(0, at), target.id, ...order.slice(at)]);
  return { ok: true, rows: rowsOf(index, orders, to) };
}

function onShelf(order: readonly string[], { afterId }: Standing): number | null {
  if (afterId === null) return 0;
  const at = order.indexOf(afterId);
  return at < 0 ? null : at + 1;
}

/** On the bench a lost neighbour is no loss: it goes to the end. */
function onBench(order: readonly string[], { benchAfterId }: Side): number {
  if (benchAfterId === null) return 0;
  const at = order.indexOf(benchAfterId);
  return at < 0 ? order.length : at + 1;
}

const matesAt = (index: BoardIndex, chainId: string | null) =>
  chainId === null ? index.bench : index.batchesOf(chainId);

const isPoured = (index: BoardIndex, id: string): boolean => {
  const batch = index.batch(id);
  return batch !== undefined && !isPencilled(batch);
};

function rowsOf(
  index: BoardIndex,
  orders: ReadonlyMap<string | null, readonly string[]>,
  to: Side,
): Batch[] {
  const rows = new Map<string, Batch>();
  const row = (id: string) => rows.get(id) ?? index.batch(id);
  for (const [chainId, order] of orders)
    for (const [at, id] of order.entries()) {
      const batch = row(id);
      if (batch && (batch.place !== at || batch.chainId !== chainId))
        rows.set(id, { ...batch, chainId, place: at });
    }
  for (const { id, brewOn, link } of to.batches) {
    const batch = row(id);
    if (batch && !(batch.brewOn === brewOn && isDeepStrictEqual(batch.link, link)))
      rows.set(id, { ...batch, brewOn, link });
  }
  return [...rows.values()];
}

/** Acceptances of links that the move did not know of, and that change by taking it back. */
function withoutLapsed(board: BoardFacts, rows: readonly Batch[], to: Side): Batch[] {
  const own = new Set(to.batches.map(({ id }) => id));
  const lapsed = lapses(board, withRows(board, rows)).filter((id) => !own.has(id));
  const done = new Map(rows.map((row) => [row.id, row]));
  for (const id of lapsed) {
    const row = done.get(id) ?? board.batches.find((batch) => batch.id === id);
    if (row) done.set(id, { ...row, link: { ...row.link, acceptance: null } });
  }
  return [...done.values()];
}

/** A batch that is none of the move's, and that would stand after another one than now. */
function strangers(before: BoardFacts, after: BoardFacts, from: Side): Batch | null {
  const [was, is] = [standingsOf(before), standingsOf(after)];
  const own = new Set(from.batches.map(({ id }) => id));
  const moved = (row: Standing) => !own.has(row.id) && was.get(row.id)?.afterId !== row.afterId;
  const stranger = [...is.values()].find(moved);
  return before.batches.find(({ id }) => id === stranger?.id) ?? null;
}

function stillUsed(board: BoardFacts, chainId: string): string | null {
  const batch = board.batches.find((each) => each.chainId === chainId);
  return batch?.name ?? null;
}
