import { eq, sql, type SQL } from 'drizzle-orm';
import { isDeepStrictEqual } from 'node:util';
import type { Tx } from '../db/client.ts';
import { RowsMoved } from '../db/inTransaction.ts';
import { blockedDay } from '../db/schema/season.ts';
import { differenceOf } from './difference.ts';
import type { Row, Snapshot } from './snapshot.ts';
import { columnsOf, TABLE_NAMES, TABLES, type TableName } from './tables.ts';

/**
 * Writes the rows that differ between two snapshots, each raised by a version. Rows come before what
 * refers to them and go after it; places are compared when the transaction ends.
 */
export async function writeRows(tx: Tx, now: Snapshot, next: Snapshot): Promise<void> {
  const { after } = differenceOf(now, next);
  for (const name of TABLE_NAMES)
    for (const [id, row] of Object.entries(after.rows[name] ?? {}))
      if (row) {
        const place = name === 'batch' ? placeOf(next.rows.batch.get(id)) : {};
        await writeRow(tx, name, id, now.rows[name].get(id), { ...row, ...place });
      }
  await writePlaces(tx, now, next);
  for (const name of TABLE_NAMES.toReversed())
    for (const [id, row] of Object.entries(after.rows[name] ?? {}))
      if (!row) await deleteRow(tx, name, id, now.rows[name].get(id));
}

/** Written with the rest: a check says that the scrapped stand nowhere, and only they. */
const placeOf = (row: Row | undefined) => ({ chain_id: row?.chain_id, place: row?.place });

async function writeRow(
  tx: Tx,
  name: TableName,
  id: string,
  was: Row | undefined,
  changes: Row,
): Promise<void> {
  const known = columnsOf(name);
  const columns = Object.keys(changes).filter((column) => known.has(column));
  const values = asRecord(name, was ? changes : { ...changes, version: raised(changes) });
  if (!was) {
    const list = sql.join(
      columns.map((column) => sql.identifier(column)),
      sql`, `,
    );
    await tx.execute(
      sql`insert into ${sql.identifier(name)} (${list}) select ${list} from ${values} r`,
    );
  } else {
    const sets: SQL[] = columns.map((c) => sql`${sql.identifier(c)} = r.${sql.identifier(c)}`);
    if (known.has('version')) sets.push(sql`version = ${sql.identifier(name)}.version + 1`);
    if (sets.length > 0)
      await demandSeen(
        tx,
        sql`update ${sql.identifier(name)} set ${sql.join(sets, sql`, `)}
          from ${values} r where ${keyIs(name, id)}${versionIs(name, was)}`,
      );
  }
  if (name === 'season' && Array.isArray(changes.blocked_days))
    await writeBlockedDays(tx, id, changes.blocked_days.map(String));
}

const raised = (row: Row): number => Number(row.version ?? 0) + 1;

const asRecord = (name: TableName, row: Row) =>
  sql`jsonb_populate_record(null::${sql.identifier(name)}, ${JSON.stringify(row)}::jsonb)`;

const keyIs = (name: TableName, id: string) =>
  sql`${sql.identifier(name)}.${sql.identifier(TABLES[name].key)} = ${id}::uuid`;

/** Of a table with versions: the row as the snapshot has it. */
const versionIs = (name: TableName, row: Row | undefined) =>
  columnsOf(name).has('version')
    ? sql` and ${sql.identifier(name)}.version = ${Number(row?.version)}`
    : sql``;

/** What all seasons share may be edited from another one, under other locks. */
async function demandSeen(tx: Tx, write: SQL): Promise<void> {
  const { rowCount } = await tx.execute(write);
  if (rowCount === 0) throw new RowsMoved();
}

/** A line that another shelf took over stays. */
async function deleteRow(tx: Tx, name: TableName, id: string, was: Row | undefined): Promise<void> {
  const spare =
    name === 'yeast_line'
      ? sql` and not exists (select 1 from chain where line_id = ${id}::uuid)`
      : sql``;
  const gone = sql`delete from ${sql.identifier(name)} where ${keyIs(name, id)}${spare}${versionIs(name, was)}`;
  if (name === 'yeast_line') await tx.execute(gone);
  else await demandSeen(tx, gone);
}

async function writeBlockedDays(tx: Tx, seasonId: string, days: readonly string[]) {
  await tx.delete(blockedDay).where(eq(blockedDay.seasonId, seasonId));
  if (days.length > 0) await tx.insert(blockedDay).values(days.map((day) => ({ seasonId, day })));
}

/** Places of batches and shelves, which no version guards. */
async function writePlaces(tx: Tx, now: Snapshot, next: Snapshot): Promise<void> {
  for (const [id, row] of next.rows.batch) {
    const was = now.rows.batch.get(id);
    const [from, to] = [
      [was?.chain_id, was?.place],
      [row.chain_id, row.place],
    ];
    if (!isDeepStrictEqual(from, to))
      await tx.execute(sql`update batch set chain_id = ${row.chain_id}::uuid, place = ${row.place}::int
        where id = ${id}::uuid`);
  }
  for (const [position, id] of next.shelves.entries())
    await tx.execute(sql`update chain set position = ${position}
      where id = ${id}::uuid and position <> ${position}`);
}
