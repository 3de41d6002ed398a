import { asc, eq } from 'drizzle-orm';
import type { Role } from '#shared/api/people.ts';
import type { Tx } from '../../db/client.ts';
import { membership } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { notFound, problem } from '../../problems.ts';
import { lockBrewery } from '../board/locks.ts';
import type { MemberRow } from './present.ts';

/**
 * The members of a brewery, under a lock that every change of a role or a membership takes: of two
 * head brewers who step down at once the second finds that there is no other left.
 */
export async function membersUnderLock(tx: Tx, breweryId: string): Promise<MemberRow[]> {
  await lockBrewery(tx, breweryId);
  return tx
    .select({
      personId: person.id,
      name: person.name,
      role: membership.role,
      version: membership.version,
    })
    .from(membership)
    .innerJoin(person, eq(person.id, membership.personId))
    .where(eq(membership.breweryId, breweryId))
    .orderBy(asc(membership.joinedAt), asc(person.name));
}

/** Somebody of the brewery; whoever is not does not exist. */
export function memberAmong(members: readonly MemberRow[], personId: string): MemberRow {
  const found = members.find((each) => each.personId === personId);
  if (!found) throw notFound();
  return found;
}

/** Who asks may have been made something else since they were let in. */
export function demandStillHead(members: readonly MemberRow[], personId: string): void {
  if (memberAmong(members, personId).role !== 'head-brewer') throw problem('not-allowed');
}

/** @param next what the one becomes; null: they leave. */
export function demandHeadLeft(
  members: readonly MemberRow[],
  personId: string,
  next: Role | null,
): void {
  const others = members.some((each) => each.personId !== personId && each.role === 'head-brewer');
  if (next === 'head-brewer' || others) return;
  const isAlone = members.length === 1;
  throw problem('last-head-brewer', {
    detail: isAlone
      ? 'Nobody else belongs to this brewery. Ask somebody in and make them head brewer first; to end the brewery, close your account.'
      : 'There is no other head brewer. Make somebody else head brewer first, then do this again.',
  });
}
