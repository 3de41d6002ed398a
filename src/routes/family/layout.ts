import type { Kin } from '#shared/chain/family.ts';

/** Where one of the family stands: its generation is its column, from 0. */
export interface Placed {
  kin: Kin;
  column: number;
  row: number;
  /** Where the cake under it comes from; null at the start. */
  from: { column: number; row: number } | null;
}

export interface FamilyLayout {
  placed: readonly Placed[];
  columns: number;
  rows: number;
}

/**
 * A chain runs along one row; each branch takes the next free row below. A start stands in the
 * column before its first batch, so that the batches of one generation stand under each other.
 */
export function layOut(family: readonly Kin[]): FamilyLayout {
  const placed: Placed[] = [];
  let rows = 0;
  const put = (kin: Kin, column: number, row: number, from: Placed['from']): void => {
    placed.push({ kin, column, row, from });
    for (const [at, child] of kin.children.entries()) {
      const own = at === 0 ? row : rows;
      if (at > 0) rows += 1;
      put(child, Math.max(columnOf(child), column + 1), own, { column, row });
    }
  };
  for (const start of family) {
    const row = rows;
    rows += 1;
    const first = start.children[0];
    put(start, first ? Math.max(0, columnOf(first) - 1) : 0, row, null);
  }
  const columns = placed.reduce((most, { column }) => Math.max(most, column + 1), 0);
  return { placed, columns, rows };
}

/** Of an unknown generation: next to what it comes from. */
const columnOf = (kin: Kin): number => (kin.kind === 'batch' ? (kin.generation ?? 0) : 0);
