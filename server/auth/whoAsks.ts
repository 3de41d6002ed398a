import type { Request } from 'express';
import { z } from 'zod';
import type { Role } from '#shared/api/people.ts';
import type { Deps } from '../deps.ts';
import type { Db } from '../db/client.ts';
import type { brewery } from '../db/schema/brewery.ts';
import { notFound, problem } from '../problems.ts';
import { findGuest, type GuestChains } from './guests.ts';
import { lookUpMember, type PlaceAsked } from './lookUpMember.ts';
import { findSession, findSignedIn, type PersonRow, type SignedIn } from './sessions.ts';

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
  const place = who === 'member' ? placeAsked(req) : null;
  if (place) return findMember(deps, req, place);
  const signedIn = await findSignedIn(deps.db, deps.clock, req);
  if (!signedIn) throw problem('not-signed-in');
  if (who === 'member') throw notFound();
  return { signedIn, member: null };
}

/** Another's brewery does not exist: the answer is the same as for a name that nobody has. */
async function findMember(
  { db, clock }: Pick<Deps, 'db' | 'clock'>,
  req: Request,
  { slug, asked }: PlaceAsked,
): Promise<{ signedIn: SignedIn; member: Member }> {
  const found = await findSession(db, clock, req, (key) =>
    lookUpMember(db, { ...key, slug, asked }),
  );
  if (!found) throw problem('not-signed-in');
  const { person, tokenHash, brewery, role, seasonId, isArchived } = found;
  const member =
    brewery && role && seasonId
      ? { person, guestOf: null, brewery, role, seasonId, isArchived }
      : await findGuestOr404(db, slug, asked, person);
  return { signedIn: { person, tokenHash }, member };
}

const uuid = z.uuid().toLowerCase();

/** The brewery and season that an address names; null where it cannot name any. */
function placeAsked({ params, query }: Request): PlaceAsked | null {
  const slug = params.brewery;
  if (typeof slug !== 'string' || slug.length > 80 || slug.includes('\0')) return null;
  const asked = params.season ?? query.season;
  if (asked === undefined) return { slug, asked: null };
  const id = uuid.safeParse(asked);
  return id.success ? { slug, asked: id.data } : null;
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
