import { isDeepStrictEqual } from 'node:util';
import type { Row, Snapshot, Stand } from './snapshot.ts';
import { isCompared, TABLE_NAMES, type TableName } from './tables.ts';

/** What differs of each row, on one side of a change; null: the row is not there. */
export type SideRows = Partial<Record<TableName, Record<string, Row | null>>>;

/** One side of an edit, as the change record keeps it. */
export interface EditSide {
  rows: SideRows;
  /** Order of the shelves, where it differs. */
  shelves?: readonly string[];
  /** By batch: which link it was that was accepted. */
  accepted?: Readonly<Record<string, string>>;
  /** It happened, and is not undone. */
  stays?: true;
}

export interface Difference {
  before: EditSide;
  after: EditSide;
  /** Ids of the rows that differ. */
  touches: string[];
  isEmpty: boolean;
}

/** What a change did to the rows of a board, seen from each side. */
export function differenceOf(before: Snapshot, after: Snapshot): Difference {
  const sides = { before: {} as SideRows, after: {} as SideRows };
  const touches = new Set<string>();
  for (const name of TABLE_NAMES) {
    const [was, is] = [before.rows[name], after.rows[name]];
    for (const id of new Set([...was.keys(), ...is.keys()])) {
      const pair = rowPair(was.get(id) ?? null, is.get(id) ?? null);
      if (!pair) continue;
      (sides.before[name] ??= {})[id] = pair[0];
      (sides.after[name] ??= {})[id] = pair[1];
      touches.add(id);
    }
  }
  const reordered = !isDeepStrictEqual(before.shelves, after.shelves);
  return {
    before: { rows: sides.before, ...(reordered && { shelves: before.shelves }) },
    after: { rows: sides.after, ...(reordered && { shelves: after.shelves }) },
    touches: [...touches],
    isEmpty: touches.size === 0 && !reordered,
  };
}

function rowPair(was: Row | null, is: Row | null): [Row | null, Row | null] | null {
  if (!was || !is) return was === is ? null : [was, is];
  const columns = Object.keys({ ...was, ...is }).filter(
    (column) => isCompared(column) && !sameValue(column, was[column], is[column]),
  );
  return columns.length === 0 ? null : [only(was, columns), only(is, columns)];
}

const only = (row: Row, columns: readonly string[]): Row =>
  Object.fromEntries(columns.map((column) => [column, row[column] ?? null]));

/** On the bench the order means nothing to anybody's yeast. */
export function sameValue(column: string, a: unknown, b: unknown): boolean {
  if (column !== 'stands') return isDeepStrictEqual(a ?? null, b ?? null);
  const [was, is] = [a as Stand | null, b as Stand | null];
  if (!was || !is) return was === is;
  return was.shelf === is.shelf && (was.shelf === null || was.after === is.after);
}
