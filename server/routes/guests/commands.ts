import { and, desc, eq, isNull, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { ChainGuest, GuestMade, GuestRequest } from '#shared/api/guest.ts';
import { hashToken, newToken } from '../../auth/tokens.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { chainGuest } from '../../db/schema/sharing.ts';
import type { Deps } from '../../deps.ts';
import { tell } from '../../live/note.ts';
import { notFound, problem } from '../../problems.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { demandChain } from '../chains/demandChain.ts';
import { tellBrewery } from '../board/record.ts';

type Hands = Pick<Deps, 'db' | 'clock'>;

const GOOD_FOR_MS = 7 * 24 * 60 * 60 * 1000;
const maker = alias(person, 'maker');
const guest = alias(person, 'guest_person');

export async function listGuests(db: Db, member: Member, chainId: string): Promise<ChainGuest[]> {
  await demandChain(db, member, chainId);
  return guestsWhere(db, member, eq(chainGuest.chainId, chainId));
}

async function guestsWhere(db: Db, member: Member, which: SQL): Promise<ChainGuest[]> {
  const rows = await db
    .select({ row: chainGuest, createdBy: maker.name, name: guest.name, fromBrewery: brewery.name })
    .from(chainGuest)
    .innerJoin(maker, eq(maker.id, chainGuest.createdBy))
    .leftJoin(guest, eq(guest.id, chainGuest.personId))
    .leftJoin(brewery, eq(brewery.id, chainGuest.guestBreweryId))
    .where(and(eq(chainGuest.breweryId, member.brewery.id), which))
    .orderBy(desc(chainGuest.createdAt));
  return rows.map(({ row, ...names }) => ({
    id: row.id,
    role: row.role,
    expiresAt: row.expiresAt.toISOString(),
    joinedAt: row.joinedAt?.toISOString() ?? null,
    withdrawnAt: row.withdrawnAt?.toISOString() ?? null,
    ...names,
  }));
}

/** Asked again under the same id (the answer was lost), it gives a new token for the same invitation. */
export async function inviteGuest(
  hands: Hands,
  member: Member,
  chainId: string,
  { id, role }: GuestRequest,
): Promise<GuestMade> {
  const token = newToken();
  const tokenHash = hashToken(token);
  await changeBoard(
    hands,
    member,
    [],
    async ({ tx, board, now }) => {
      const chain = one(board.chains, chainId);
      const place = { breweryId: member.brewery.id, chainId, createdBy: member.person.id };
      const expiresAt = new Date(now.getTime() + GOOD_FOR_MS);
      const made = await tx
        .insert(chainGuest)
        .values({ id, role, tokenHash, ...place, createdAt: now, expiresAt })
        .onConflictDoNothing({ target: chainGuest.id })
        .returning({ id: chainGuest.id });
      const what = `Invited a guest ${role} to ${chain.name}`;
      if (made.length > 0) return { what, before: null, after: { role }, touches: [chainId] };
      const again = await tx
        .update(chainGuest)
        .set({ tokenHash })
        .where(
          and(
            eq(chainGuest.id, id),
            eq(chainGuest.role, role),
            eq(chainGuest.chainId, chainId),
            eq(chainGuest.breweryId, place.breweryId),
            eq(chainGuest.createdBy, place.createdBy),
            isNull(chainGuest.joinedAt),
            isNull(chainGuest.withdrawnAt),
          ),
        )
        .returning({ id: chainGuest.id });
      if (again.length === 0)
        throw problem('already-exists', { detail: 'This id is in use: make a new one' });
      return null;
    },
    'archived-too',
  );
  const [made] = await guestsWhere(hands.db, member, eq(chainGuest.id, id));
  if (!made) throw notFound();
  return { ...made, token };
}

/** From now on the guest sees nothing of the chain; what they did stays in the record. */
export async function withdrawGuest(hands: Hands, member: Member, id: string): Promise<void> {
  await changeBoard(
    hands,
    member,
    [],
    async ({ tx, now }) => {
      const [row] = await tx
        .select()
        .from(chainGuest)
        .where(and(eq(chainGuest.breweryId, member.brewery.id), eq(chainGuest.id, id)))
        .for('update');
      if (!row) throw notFound();
      if (row.withdrawnAt !== null) return null;
      await tx.update(chainGuest).set({ withdrawnAt: now }).where(eq(chainGuest.id, id));
      if (row.guestBreweryId !== null) await tellBrewery(tx, row.guestBreweryId);
      if (row.personId !== null) await tell(tx, { kind: 'person', personId: row.personId });
      const what = row.joinedAt ? 'Ended a guest’s access' : 'Withdrew an invitation to a chain';
      return { what, before: { role: row.role }, after: null, touches: [row.chainId] };
    },
    'archived-too',
  );
}
