import { isDeepStrictEqual } from 'node:util';
import type { EditSide } from './difference.ts';
import { refuse, type Refused } from './refused.ts';
import { ordersOf, standOf, type Row, type Snapshot, type Stand } from './snapshot.ts';

type Orders = Map<string | null, string[]>;

/** The batches with the places that they have when the edit is taken back. */
export function placeBatches(
  now: Snapshot,
  next: ReadonlyMap<string, Row>,
  from: EditSide,
  to: EditSide,
): { ok: true; batches: Map<string, Row> } | Refused {
  const orders = ordersOf(now);
  const changes = Object.entries(to.rows.batch ?? {}).flatMap(([id, row]) =>
    changesShelf(from.rows.batch?.[id] ?? null, row) ? [{ id, stand: standOf(row) }] : [],
  );
  const leaving = new Set(changes.map(({ id }) => id));
  for (const [shelf, order] of orders)
    orders.set(
      shelf,
      order.filter((id) => !leaving.has(id)),
    );
  const lost = insertAll(orders, changes);
  if (lost) return refuse('The batch before it is no longer on that shelf', lost);
  const batches = numbered(next, orders);
  const stranger = strangerIn(now, batches, to);
  return stranger
    ? refuse(`${String(stranger.name)} stands there since`, String(stranger.id))
    : { ok: true, batches };
}

/** True of a row that comes to another shelf, comes back, or goes. */
function changesShelf(from: Row | null, to: Row | null): boolean {
  if (!from || !to) return true;
  if (!('stands' in to)) return false;
  const [was, is] = [standOf(from), standOf(to)];
  return !was || !is || was.shelf !== is.shelf;
}

/** Puts each behind its own neighbour, who may come by the same change. Answers one that found none. */
function insertAll(
  orders: Orders,
  changes: readonly { id: string; stand: Stand | null }[],
): string | null {
  let waiting = changes.flatMap(({ id, stand }) => (stand ? [{ id, stand }] : []));
  while (waiting.length > 0) {
    const left = waiting.filter(({ id, stand }) => !insert(orders, id, stand));
    if (left.length < waiting.length) {
      waiting = left;
      continue;
    }
    // On the bench a lost neighbour is no loss: it goes to the end.
    const lost = left.find(({ stand }) => stand.shelf !== null);
    if (lost) return lost.id;
    orders.set(null, [...(orders.get(null) ?? []), ...left.map(({ id }) => id)]);
    return null;
  }
  return null;
}

function insert(orders: Orders, id: string, { shelf, after }: Stand): boolean {
  const order = orders.get(shelf) ?? [];
  const at = after === null ? 0 : order.indexOf(after) + 1;
  if (after !== null && at === 0) return false;
  orders.set(shelf, [...order.slice(0, at), id, ...order.slice(at)]);
  return true;
}

function numbered(next: ReadonlyMap<string, Row>, orders: Orders): Map<string, Row> {
  const batches = new Map(next);
  for (const [id, row] of next)
    if (row.stage === 'scrapped')
      batches.set(id, { ...row, chain_id: null, place: null, stands: null });
  for (const [shelf, order] of orders)
    for (const [place, id] of order.entries()) {
      const row = next.get(id);
      const stands: Stand = { shelf, after: order[place - 1] ?? null };
      if (row) batches.set(id, { ...row, chain_id: shelf, place, stands });
    }
  return batches;
}

/** A batch on a shelf that would stand after another one than it should. */
function strangerIn(
  now: Snapshot,
  batches: ReadonlyMap<string, Row>,
  to: EditSide,
): Row | undefined {
  return [...batches.values()].find((row) => {
    const is = standOf(row);
    if (!is || is.shelf === null) return false;
    const id = String(row.id);
    const own = to.rows.batch?.[id];
    const should = own && 'stands' in own ? standOf(own) : standOf(now.rows.batch.get(id));
    return !isDeepStrictEqual(is, should);
  });
}

/** The order of the shelves when the edit is taken back. */
export function placeShelves(
  now: Snapshot,
  next: ReadonlyMap<string, Row>,
  from: EditSide,
  to: EditSide,
): { ok: true; order: string[] } | Refused {
  const stay = now.shelves.filter((id) => next.has(id));
  if (!from.shelves || !to.shelves) return { ok: true, order: stay };
  const wished = to.shelves.filter((id) => next.has(id));
  const isReordering = isDeepStrictEqual(from.shelves.toSorted(), to.shelves.toSorted());
  if (isReordering) {
    const known = new Set(from.shelves);
    const asLeft = from.shelves.filter((id) => next.has(id));
    if (
      !isDeepStrictEqual(
        stay.filter((id) => known.has(id)),
        asLeft,
      )
    )
      return refuse('The shelves were put in another order since', null);
    return { ok: true, order: joined(wished, now.shelves, stay) };
  }
  return { ok: true, order: joined(stay, to.shelves, wished) };
}

/** An order with what it lacks of `more` put in, each behind its nearest neighbour in `like`. */
function joined(order: readonly string[], like: readonly string[], more: readonly string[]) {
  const all = [...order];
  for (const id of more) {
    if (all.includes(id)) continue;
    const before = like.slice(0, like.indexOf(id)).findLast((each) => all.includes(each));
    all.splice(before === undefined ? 0 : all.indexOf(before) + 1, 0, id);
  }
  return all;
}
