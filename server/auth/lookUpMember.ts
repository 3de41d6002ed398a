import DataLoader from 'dataloader';
import { and, eq, gt, sql } from 'drizzle-orm';
import type { Db } from '../db/client.ts';
import { oncePer } from '../db/oncePer.ts';
import { brewery, membership } from '../db/schema/brewery.ts';
import { person, session } from '../db/schema/people.ts';
import { season } from '../db/schema/season.ts';
import { SESSION, type SessionKey } from './sessions.ts';

/** The brewery and season that an address names. */
export interface PlaceAsked {
  slug: string;
  /** The season; null: the current one. */
  asked: string | null;
}

type Asking = SessionKey & PlaceAsked;

/**
 * A request's session, and what its owner is at that place: in one statement, since it is asked
 * before every request, and one for all requests that come in together. Nothing is kept: who was
 * removed is out with the next request.
 * @returns undefined where no session is open. The brewery is null where there is none of this name,
 *   role and season for who is no member.
 */
export const lookUpMember = async (db: Db, asking: Asking) =>
  (await loader(db).load(asking)) ?? undefined;

const loader = oncePer(
  (db: Db) =>
    new DataLoader((asking: readonly Asking[]) => lookUp(db, asking), {
      cache: false,
      batchScheduleFn: setImmediate,
    }),
);

async function lookUp(db: Db, asking: readonly Asking[]) {
  const found = await memberQuery(db).execute({
    tokenHashes: asking.map(({ tokenHash }) => tokenHash),
    slugs: asking.map(({ slug }) => slug),
    seasons: asking.map(({ asked }) => asked),
    now: asking[0]?.now,
  });
  const byNumber = new Map(found.map((row) => [row.number, row]));
  return asking.map((_, at) => byNumber.get(at + 1) ?? null);
}

const ASKED = sql`unnest(
  ${sql.placeholder('tokenHashes')}::text[], ${sql.placeholder('slugs')}::text[],
  ${sql.placeholder('seasons')}::uuid[]) with ordinality
  as asked (token_hash, slug, season_id, number)`;

const memberQuery = oncePer((db: Db) => {
  const seasons = db
    .select({ id: season.id, archivedAt: season.archivedAt })
    .from(season)
    .where(
      and(
        eq(season.breweryId, membership.breweryId),
        sql`(asked.season_id is null or ${season.id} = asked.season_id)`,
      ),
    )
    .orderBy(sql`(${season.id} = ${brewery.currentSeasonId}) desc nulls last`, season.createdAt)
    .limit(1)
    .as('seasons');
  return db
    .select({
      ...SESSION,
      number: sql<number>`asked.number::int`,
      brewery,
      role: membership.role,
      seasonId: seasons.id,
      isArchived: sql<boolean>`${seasons.archivedAt} is not null`,
    })
    .from(ASKED)
    .innerJoin(session, sql`${session.tokenHash} = asked.token_hash`)
    .innerJoin(person, eq(person.id, session.personId))
    .leftJoin(brewery, sql`${brewery.slug} = asked.slug`)
    .leftJoin(
      membership,
      and(eq(membership.breweryId, brewery.id), eq(membership.personId, person.id)),
    )
    .leftJoinLateral(seasons, sql`true`)
    .where(gt(session.expiresAt, sql.placeholder('now')))
    .prepare('members');
});
