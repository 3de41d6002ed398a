import { asc, eq, inArray, sql } from 'drizzle-orm';
import type { BreweryLoss, ClosingPreview } from '#shared/api/account.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery, membership } from '../../db/schema/brewery.ts';
import { problem } from '../../problems.ts';
import { leaveUnderLock } from '../people/leave.ts';
import { membersUnderLock } from '../people/underLock.ts';
import { endBrewery } from './endBrewery.ts';
import { redact } from './redact.ts';

type Brewery = typeof brewery.$inferSelect;
interface Belonging {
  brewery: Brewery;
  /** Nobody else belongs to it. */
  isAlone: boolean;
  /** There are others, and none of them is head brewer. */
  isOnlyHead: boolean;
}

/** What closing the account would do now. */
export async function closingPreview(db: Db | Tx, personId: string): Promise<ClosingPreview> {
  const all = await belongings(db, personId);
  const named = (those: readonly Belonging[]) =>
    those.map(({ brewery: { slug, name } }) => ({ slug, name }));
  return {
    goes: await losses(
      db,
      all.filter(({ isAlone }) => isAlone).map((each) => each.brewery.id),
    ),
    stays: named(all.filter(({ isAlone, isOnlyHead }) => !isAlone && !isOnlyHead)),
    heldBy: named(all.filter(({ isOnlyHead }) => isOnlyHead)),
  };
}

/** In the order of their ids, in which they are locked. */
async function belongings(db: Db | Tx, personId: string): Promise<Belonging[]> {
  const others = sql`${membership.personId} <> ${personId}`;
  const rows = await db
    .select({
      brewery,
      others: sql<number>`(count(*) filter (where ${others}))::int`,
      otherHeads: sql<number>`(count(*) filter (where ${others} and ${membership.role} = 'head-brewer'))::int`,
      isHead: sql<boolean>`bool_or(not ${others} and ${membership.role} = 'head-brewer')`,
    })
    .from(brewery)
    .innerJoin(membership, eq(membership.breweryId, brewery.id))
    .where(
      inArray(
        brewery.id,
        db
          .select({ id: membership.breweryId })
          .from(membership)
          .where(eq(membership.personId, personId)),
      ),
    )
    .groupBy(brewery.id)
    .orderBy(asc(brewery.id));
  return rows.map((row) => ({
    brewery: row.brewery,
    isAlone: row.others === 0,
    isOnlyHead: row.others > 0 && row.isHead && row.otherHeads === 0,
  }));
}

async function losses(db: Db | Tx, ids: readonly string[]): Promise<BreweryLoss[]> {
  // Written out with its table: inside the counted ones a bare id would be theirs.
  const own = sql`"brewery"."id"`;
  const count = (what: string) =>
    sql<number>`(select count(*)::int from ${sql.identifier(what)} where brewery_id = ${own})`;
  if (ids.length === 0) return [];
  return db
    .select({
      id: brewery.id,
      name: brewery.name,
      seasons: count('season'),
      chains: count('chain'),
      batches: count('batch'),
      yeasts: count('yeast'),
      vessels: count('vessel'),
      comments: count('comment'),
      shared: sql<number>`(select count(*)::int from share_link where brewery_id = ${own} and withdrawn_at is null)
        + (select count(*)::int from chain_guest where brewery_id = ${own} and withdrawn_at is null and joined_at is not null)`,
    })
    .from(brewery)
    .where(inArray(brewery.id, [...ids]))
    .orderBy(brewery.name, brewery.id);
}

/**
 * Ends the account: leaves each brewery, takes along those that nobody else belongs to, and puts
 * "a former brewer" in place of the name.
 * @param losing ids of the breweries that their owner has been told will go
 */
export async function closeAccount(
  tx: Tx,
  who: PersonRow,
  losing: readonly string[],
  now: Date,
): Promise<void> {
  for (const { brewery: each } of await belongings(tx, who.id)) await membersUnderLock(tx, each.id);
  const preview = await closingPreview(tx, who.id);
  const [held] = preview.heldBy;
  if (held)
    throw problem('last-head-brewer', {
      detail: `You are the only head brewer of ${held.name}. Make somebody else head brewer there first.`,
      current: preview,
    });
  const going = preview.goes.map(({ id }) => id);
  const isAsTold = going.length === losing.length && going.every((id) => losing.includes(id));
  if (!isAsTold)
    throw problem('changed-since', {
      detail: 'What would be lost has changed: look at it again',
      current: preview,
    });
  for (const id of going) await endBrewery(tx, id);
  for (const { brewery: each } of await belongings(tx, who.id)) {
    const place = { brewery: each, person: who, seasonId: await seasonOf(tx, each) };
    await leaveUnderLock(tx, place, await membersUnderLock(tx, each.id), now);
  }
  await redact(tx, who, now);
}

async function seasonOf(tx: Tx, { id, currentSeasonId }: Brewery): Promise<string> {
  const { rows } = await tx.execute<{ id: string }>(sql`
    select id from season where brewery_id = ${id}
    order by id is not distinct from ${currentSeasonId}::uuid desc, created_at limit 1`);
  if (!rows[0]) throw new Error('A brewery has no season');
  return rows[0].id;
}
