import { and, eq, sql } from 'drizzle-orm';
import type { Request } from 'express';
import { z } from 'zod';
import type { Role } from '#shared/api/people.ts';
import type { Deps } from '../deps.ts';
import type { Db } from '../db/client.ts';
import { oncePer } from '../db/oncePer.ts';
import { brewery, membership } from '../db/schema/brewery.ts';
import { season } from '../db/schema/season.ts';
import { notFound, problem } from '../problems.ts';
import { findGuest, type GuestChains } from './guests.ts';
import { findSignedIn, type PersonRow, type SignedIn } from './sessions.ts';

export type { SignedIn } from './sessions.ts';

export type Who = 'anyone' | 'signed-in' | 'member';

/** Somebody in the brewery that the address names. */
export interface Member {
  person: PersonRow;
  role: Role;
  brewery: typeof brewery.$inferSelect;
  /** The season that is worked on: the one that the address names, else the current one. */
  seasonId: string;
  /** It is put away: it is read, not changed. */
  isArchived: boolean;
  /** Null: a member. Else somebody of another brewery, and the chains that they may see. */
  guestOf: GuestChains | null;
}

export async function whoAsks(
  who: Who,
  deps: Pick<Deps, 'db' | 'clock'>,
  req: Request,
): Promise<{ signedIn: SignedIn | null; member: Member | null }> {
  if (who === 'anyone') return { signedIn: null, member: null };
  const signedIn = await findSignedIn(deps.db, deps.clock, req);
  if (!signedIn) throw problem('not-signed-in');
  if (who === 'signed-in') return { signedIn, member: null };
  return { signedIn, member: await findMember(deps, req, signedIn.person) };
}

/** Another's brewery does not exist: the answer is the same as for a name that nobody has. */
async function findMember(
  { db }: Pick<Deps, 'db'>,
  req: Request,
  person: PersonRow,
): Promise<Member> {
  const slug = req.params.brewery;
  if (typeof slug !== 'string' || slug.length > 80 || slug.includes('\0')) throw notFound();
  const asked = seasonAsked(req);
  const [found] = await memberQuery(db).execute({ slug, personId: person.id, asked });
  if (found) return { person, guestOf: null, ...found };
  return findGuestOr404(db, slug, asked, person);
}

const uuid = z.uuid().toLowerCase();

/** Null: the current one. What cannot be a season is none. */
function seasonAsked({ params, query }: Request): string | null {
  const asked = params.season ?? query.season;
  if (asked === undefined) return null;
  const id = uuid.safeParse(asked);
  if (!id.success) throw notFound();
  return id.data;
}

/** A guest has the strongest of the roles that they have on a chain; each chain is asked again. */
async function findGuestOr404(
  db: Db,
  slug: string,
  asked: string | null,
  person: PersonRow,
): Promise<Member> {
  const guest = await findGuest(db, slug, asked, person.id);
  if (!guest) throw notFound();
  const { chains, ...where } = guest;
  const role = [...chains.values()].includes('brewer') ? 'brewer' : 'taster';
  return { person, role, ...where, guestOf: chains };
}

const memberQuery = oncePer((db: Db) =>
  db
    .select({
      brewery,
      role: membership.role,
      seasonId: season.id,
      isArchived: sql<boolean>`${season.archivedAt} is not null`,
    })
    .from(brewery)
    .innerJoin(membership, eq(membership.breweryId, brewery.id))
    .innerJoin(season, eq(season.breweryId, brewery.id))
    .where(
      and(
        eq(brewery.slug, sql.placeholder('slug')),
        eq(membership.personId, sql.placeholder('personId')),
        sql`(${sql.placeholder('asked')}::uuid is null or ${season.id} = ${sql.placeholder('asked')}::uuid)`,
      ),
    )
    .orderBy(sql`(${season.id} = ${brewery.currentSeasonId}) desc nulls last`, season.createdAt)
    .limit(1)
    .prepare('member'),
);
