/** Places of one shelf that stand together in the ranking. */
export interface Run<Row> {
  shelf: string | null;
  rows: Row[];
}

/**
 * Gathers neighbours of one shelf under its name. Their order stays: the list is a ranking, and the
 * keys walk it.
 */
export function runsOf<Row extends { shelf: string | null }>(ranked: readonly Row[]): Run<Row>[] {
  const runs: Run<Row>[] = [];
  for (const row of ranked) {
    const last = runs.at(-1);
    if (last && row.shelf !== null && last.shelf === row.shelf) last.rows.push(row);
    else runs.push({ shelf: row.shelf, rows: [row] });
  }
  return runs;
}
