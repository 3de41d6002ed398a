import { sameValue, type EditSide } from './difference.ts';
import { faultsOf } from './integrity.ts';
import { placeBatches, placeShelves } from './places.ts';
import { refuse, type Refused } from './refused.ts';
import type { Row, Snapshot } from './snapshot.ts';
import { isCompared, TABLE_NAMES, type TableName } from './tables.ts';

export type TakenBack = { ok: true; next: Snapshot } | Refused;

/**
 * The board's rows with one edit taken back: every row of it as on the other side, what others
 * changed beside it as it is. Refused where a value that the edit wrote was changed since, or where
 * something of later date could not stand any more.
 */
export function takeBackRows(now: Snapshot, from: EditSide, to: EditSide): TakenBack {
  const changed = changedSince(now, from);
  if (changed) return changed;
  const rows = Object.fromEntries(
    TABLE_NAMES.map((name) => [name, tableWith(now.rows[name], name, to)]),
  ) as Record<TableName, Map<string, Row>>;
  const placed = placeBatches(now, rows.batch, from, to);
  if (!placed.ok) return placed;
  const shelves = placeShelves(now, rows.chain, from, to);
  if (!shelves.ok) return shelves;
  const next: Snapshot = { rows: { ...rows, batch: placed.batches }, shelves: shelves.order };
  const old = faultsOf(now);
  for (const [about, detail] of faultsOf(next))
    if (!old.has(about)) return refuse(detail, about.split(' ')[0] ?? null);
  return { ok: true, next };
}

/** Tables whose rows bear the id of the batch that they are about. */
const OF_BATCH: ReadonlySet<TableName> = new Set(['cake', 'cake_check']);

function changedSince(now: Snapshot, from: EditSide): Refused | null {
  for (const name of TABLE_NAMES)
    for (const [id, was] of Object.entries(from.rows[name] ?? {})) {
      const is = now.rows[name].get(id) ?? null;
      const about = OF_BATCH.has(name) ? now.rows.batch.get(id) : (is ?? was);
      if (!sameRow(was, is)) return refuse(sinceWords(name, about ?? null, was, is), id);
    }
  return null;
}

function sameRow(was: Row | null, is: Row | null): boolean {
  if (!was || !is) return was === is;
  return Object.keys(was).every(
    (column) => !isCompared(column) || sameValue(column, was[column], is[column]),
  );
}

function sinceWords(table: TableName, about: Row | null, was: Row | null, is: Row | null): string {
  const name = nameOf(table, about);
  if (was && !is) return `${name} is no longer there`;
  if (!was) return `${name} is there again`;
  return `${name} was changed since`;
}

function nameOf(table: TableName, row: Row | null): string {
  switch (table) {
    case 'brewery':
      return 'The brewery';
    case 'season':
      return 'The season';
    case 'house_rules':
      return 'The house rules';
    case 'yeast_line':
      return 'The yeast of the shelf';
    case 'chain':
      return `The shelf ${String(row?.name ?? '')}`.trim();
    case 'cake':
    case 'cake_check':
      return `The cake of ${String(row?.name ?? 'a batch')}`;
    case 'yeast':
    case 'vessel':
    case 'batch':
      return String(row?.name ?? 'A row of it');
  }
}

function tableWith(
  rows: ReadonlyMap<string, Row>,
  name: TableName,
  to: EditSide,
): Map<string, Row> {
  const next = new Map(rows);
  for (const [id, row] of Object.entries(to.rows[name] ?? {})) {
    if (row) next.set(id, { ...next.get(id), ...row });
    else next.delete(id);
  }
  return next;
}
