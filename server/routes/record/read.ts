import { alias } from 'drizzle-orm/pg-core';
import { and, desc, eq, gte, lt, sql, type SQL } from 'drizzle-orm';
import type { RecordPage, RecordQuery } from '#shared/api/record.ts';
import { addDays } from '#shared/units/day.ts';
import type { Db } from '../../db/client.ts';
import type { brewery } from '../../db/schema/brewery.ts';
import { change } from '../../db/schema/change.ts';
import { person } from '../../db/schema/people.ts';
import { endOfDayIn } from '../../today.ts';
import { presentEntry } from './present.ts';

const PAGE = 50;
/** Whom an entry is about, where it is about somebody. */
const whom = alias(person, 'whom');

type Brewery = typeof brewery.$inferSelect;

/** What happened in one season, newest first, a page at a time. */
export async function readRecord(
  db: Db,
  { timeZone }: Pick<Brewery, 'timeZone'>,
  seasonId: string,
  query: RecordQuery,
): Promise<RecordPage> {
  const rows = await db
    .select({ change, name: person.name, whom: whom.name, lastKind })
    .from(change)
    .innerJoin(person, eq(person.id, change.personId))
    .leftJoin(whom, sql`${whom.id} = (${change.after} ->> 'whom')::uuid`)
    .where(and(eq(change.seasonId, seasonId), ...filters(query, timeZone)))
    .orderBy(desc(change.seq))
    .limit(PAGE + 1);
  const shown = rows.slice(0, PAGE);
  const last = rows.length > PAGE ? shown.at(-1) : undefined;
  return {
    changes: shown.map((row) => presentEntry(row, timeZone)),
    next: last ? String(last.change.seq) : null,
  };
}

/** Undo or redo, whichever came last of a change. */
const lastKind = sql<string | null>`(
  select u.kind from change u where u.of_change = ${change.id} order by u.seq desc limit 1
)`;

function filters(query: RecordQuery, timeZone: string): SQL[] {
  const { person: by, batch, chain, from, to, before } = query;
  const touching = (id: string) => sql`${change.touches} @> array[${id}::uuid]`;
  return [
    ...(by === undefined ? [] : [eq(change.personId, by)]),
    ...(batch === undefined ? [] : [touching(batch)]),
    ...(chain === undefined ? [] : [touching(chain)]),
    ...(from === undefined ? [] : [gte(change.at, endOfDayIn(timeZone, addDays(from, -1)))]),
    ...(to === undefined ? [] : [lt(change.at, endOfDayIn(timeZone, to))]),
    ...(before === undefined ? [] : [lt(change.seq, Number(before))]),
  ];
}
