import { and, eq, sql } from 'drizzle-orm';
import type { HandOver } from '#shared/api/membership.ts';
import type { Member as MemberAnswer, Role } from '#shared/api/people.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { membership } from '../../db/schema/brewery.ts';
import type { Deps } from '../../deps.ts';
import { demandVersion } from '../../http/etag.ts';
import { tellBrewery } from '../board/record.ts';
import { recordMembership, WHOM } from './entry.ts';
import { withdrawOpenLinks } from './openLinks.ts';
import { presentMember, type MemberRow } from './present.ts';
import { demandHeadLeft, demandStillHead, memberAmong, membersUnderLock } from './underLock.ts';

type Hands = Pick<Deps, 'clock'> & { db: Db };

const WORDS: Record<Role, string> = {
  'head-brewer': 'head brewer',
  brewer: 'a brewer',
  taster: 'a taster',
};

/** @returns the row as it is now */
export function changeRole(
  { db, clock }: Hands,
  head: Member,
  personId: string,
  version: number,
  role: Role,
): Promise<MemberAnswer> {
  return inTransaction(db, async (tx) => {
    const members = await membersUnderLock(tx, head.brewery.id);
    demandStillHead(members, head.person.id);
    const row = memberAmong(members, personId);
    demandVersion(version, row.version, presentMember(row));
    if (row.role === role) return presentMember(row);
    demandHeadLeft(members, personId, role);
    await give(tx, head.brewery.id, row, role);
    const what = `Made ${WHOM} ${WORDS[role]}`;
    const at = clock.now();
    await recordMembership(tx, head, at, { what, personId, before: row.role, after: role });
    await tellBrewery(tx, head.brewery.id);
    return presentMember({ ...row, role, version: row.version + 1 });
  });
}

/** Makes somebody head brewer and, where wished, makes oneself less in the same moment. */
export function handOver(
  { db, clock }: Hands,
  head: Member,
  personId: string,
  version: number,
  { stepDownTo }: HandOver,
): Promise<MemberAnswer[]> {
  return inTransaction(db, async (tx) => {
    const breweryId = head.brewery.id;
    const members = await membersUnderLock(tx, breweryId);
    demandStillHead(members, head.person.id);
    const next = memberAmong(members, personId);
    demandVersion(version, next.version, presentMember(next));
    const own = memberAmong(members, head.person.id);
    const at = clock.now();
    if (next.role !== 'head-brewer') {
      await give(tx, breweryId, next, 'head-brewer');
      const what = `Made ${WHOM} head brewer`;
      const told = { what, personId, before: next.role, after: 'head-brewer' as const };
      await recordMembership(tx, head, at, told);
    }
    if (stepDownTo !== null && own.personId !== personId) {
      await give(tx, breweryId, own, stepDownTo);
      const what = `Stepped down to ${WORDS[stepDownTo]}`;
      const told = { what, personId: own.personId, before: own.role, after: stepDownTo };
      await recordMembership(tx, head, at, told);
    }
    await tellBrewery(tx, breweryId);
    return (await membersUnderLock(tx, breweryId)).map(presentMember);
  });
}

/** Who is no longer head brewer leaves no open invitation behind. */
async function give(tx: Tx, breweryId: string, row: MemberRow, role: Role): Promise<void> {
  await tx
    .update(membership)
    .set({ role, version: sql`${membership.version} + 1` })
    .where(and(eq(membership.breweryId, breweryId), eq(membership.personId, row.personId)));
  if (row.role === 'head-brewer' && role !== 'head-brewer')
    await withdrawOpenLinks(tx, breweryId, row.personId);
}
