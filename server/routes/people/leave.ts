import { and, eq } from 'drizzle-orm';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { membership } from '../../db/schema/brewery.ts';
import type { Deps } from '../../deps.ts';
import { demandVersion } from '../../http/etag.ts';
import { tell } from '../../live/note.ts';
import { leaveChainsOn } from '../guests/leave.ts';
import { tellBrewery } from '../board/record.ts';
import { recordMembership, WHOM } from './entry.ts';
import { withdrawOpenLinks } from './openLinks.ts';
import { presentMember, type MemberRow } from './present.ts';
import { demandHeadLeft, demandStillHead, memberAmong, membersUnderLock } from './underLock.ts';

type Hands = Pick<Deps, 'clock'> & { db: Db };

/** Their streams of this brewery end; what they did stays in the record under their name. */
export function removeMember(
  { db, clock }: Hands,
  head: Member,
  personId: string,
  version: number,
): Promise<void> {
  return inTransaction(db, async (tx) => {
    const members = await membersUnderLock(tx, head.brewery.id);
    demandStillHead(members, head.person.id);
    const row = memberAmong(members, personId);
    demandVersion(version, row.version, presentMember(row));
    demandHeadLeft(members, personId, null);
    await endMembership(tx, head.brewery.id, row, clock.now());
    const what = `Removed ${WHOM} from the brewery`;
    await recordMembership(tx, head, clock.now(), {
      what,
      personId,
      before: row.role,
      after: null,
    });
  });
}

export function leaveBrewery({ db, clock }: Hands, member: Member, version: number): Promise<void> {
  return inTransaction(db, async (tx) => {
    const members = await membersUnderLock(tx, member.brewery.id);
    const row = memberAmong(members, member.person.id);
    demandVersion(version, row.version, presentMember(row));
    await leaveUnderLock(tx, member, members, clock.now());
  });
}

/** @param members as they are under the lock */
export async function leaveUnderLock(
  tx: Tx,
  member: Pick<Member, 'brewery' | 'seasonId' | 'person'>,
  members: readonly MemberRow[],
  at: Date,
): Promise<void> {
  const row = memberAmong(members, member.person.id);
  demandHeadLeft(members, row.personId, null);
  await endMembership(tx, member.brewery.id, row, at);
  const told = { personId: row.personId, before: row.role, after: null };
  await recordMembership(tx, member, at, { what: 'Left the brewery', ...told });
}

async function endMembership(
  tx: Tx,
  breweryId: string,
  { personId }: MemberRow,
  at: Date,
): Promise<void> {
  await tx
    .delete(membership)
    .where(and(eq(membership.breweryId, breweryId), eq(membership.personId, personId)));
  await withdrawOpenLinks(tx, breweryId, personId);
  await tellBrewery(tx, breweryId);
  await leaveChainsOn(tx, { id: personId }, breweryId, at);
  await tell(tx, { kind: 'person', personId });
}
