import { standOf, type Row, type Snapshot } from './snapshot.ts';

/**
 * What could not stand on a board, by what it is about: a reference to what is not there, a brewed
 * batch behind one that is not, a cake of another yeast.
 */
export function faultsOf(snapshot: Snapshot): Map<string, string> {
  const faults = new Map<string, string>();
  for (const row of snapshot.rows.chain.values()) chainFaults(snapshot, row, faults);
  for (const row of snapshot.rows.batch.values()) batchFaults(snapshot, row, faults);
  return faults;
}

function chainFaults({ rows }: Snapshot, row: Row, faults: Map<string, string>): void {
  const say = (about: string, detail: string) => faults.set(`${String(row.id)} ${about}`, detail);
  const name = `The shelf ${String(row.name)}`;
  if (!rows.yeast.has(String(row.yeast_id))) say('yeast', `${name} needs the yeast`);
  if (!rows.yeast_line.has(String(row.line_id))) say('line', `${name} needs the yeast it comes of`);
  if (row.vessel_id && !rows.vessel.has(String(row.vessel_id)))
    say('vessel', `${name} needs the vessel`);
  if (row.start_kind !== 'cake') return;
  const source = rows.batch.get(String(row.start_batch_id));
  const shelf = rows.chain.get(standOf(source)?.shelf ?? '');
  if (!source || !shelf) say('start', `${name} starts from a cake that would not be there`);
  else if (shelf.yeast_id !== row.yeast_id) say('start', `${name} lives on that yeast`);
}

function batchFaults({ rows }: Snapshot, row: Row, faults: Map<string, string>): void {
  const say = (about: string, detail: string) => faults.set(`${String(row.id)} ${about}`, detail);
  const name = String(row.name);
  if (row.yeast_id && !rows.yeast.has(String(row.yeast_id)))
    say('yeast', `${name} asks for the yeast`);
  if (row.vessel_id && !rows.vessel.has(String(row.vessel_id)))
    say('vessel', `${name} uses the vessel`);
  const stand = standOf(row);
  if (stand?.shelf && !rows.chain.has(stand.shelf)) say('shelf', `${name} stands on the shelf`);
  if (row.stage !== 'fermenting' && row.stage !== 'racked') return;
  if (!stand?.shelf) say('brewed', `${name} stands on no shelf, so it cannot have been brewed`);
  const before = rows.batch.get(stand?.after ?? '');
  if (before?.stage === 'pencilled') say('brewed', `${String(before.name)} is not brewed yet`);
}
