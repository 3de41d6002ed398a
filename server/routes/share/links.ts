import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { addDays } from '#shared/units/day.ts';
import type {
  ShareLink,
  ShareLinkMade,
  ShareLinkPatch,
  ShareLinkRequest,
} from '#shared/api/share.ts';
import { hashToken, newToken } from '../../auth/tokens.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Db, Tx } from '../../db/client.ts';
import { person } from '../../db/schema/people.ts';
import { shareLink } from '../../db/schema/sharing.ts';
import type { Deps } from '../../deps.ts';
import { demandVersion } from '../../http/etag.ts';
import { invalidField, notFound, problem } from '../../problems.ts';
import { dayIn, endOfDayIn } from '../../today.ts';
import { changeBoard } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';
import { demandChain } from '../chains/demandChain.ts';

type Row = typeof shareLink.$inferSelect;
type Hands = Pick<Deps, 'db' | 'clock'>;

const LONGEST_DAYS = 400;

export async function listShareLinks(db: Db, member: Member, chainId: string) {
  await demandChain(db, member, chainId);
  const rows = await linksWhere(db, member, eq(shareLink.chainId, chainId));
  return rows.map((row) => present(row, member));
}

export async function readShareLink(db: Db | Tx, member: Member, id: string): Promise<ShareLink> {
  const [row] = await linksWhere(db, member, eq(shareLink.id, id));
  if (!row) throw notFound();
  return present(row, member);
}

const linksWhere = (db: Db | Tx, { brewery }: Member, which: ReturnType<typeof eq>) =>
  db
    .select({ link: shareLink, createdBy: person.name })
    .from(shareLink)
    .innerJoin(person, eq(person.id, shareLink.createdBy))
    .where(and(eq(shareLink.breweryId, brewery.id), which))
    .orderBy(desc(shareLink.createdAt));

function present({ link, createdBy }: { link: Row; createdBy: string }, member: Member): ShareLink {
  const dayOf = (at: Date) => dayIn(member.brewery.timeZone, at);
  return {
    id: link.id,
    version: link.version,
    name: link.name,
    showPrices: link.showPrices,
    createdBy,
    createdOn: dayOf(link.createdAt),
    expiresOn: dayOf(new Date(link.expiresAt.getTime() - 1)),
    withdrawnAt: link.withdrawnAt?.toISOString() ?? null,
    visits: link.visits,
    lastVisitAt: link.lastVisitAt?.toISOString() ?? null,
  };
}

/** Until the end of that day, today at the earliest. */
function endOf({ brewery }: Member, expiresOn: string, now: Date): Date {
  const today = dayIn(brewery.timeZone, now);
  if (expiresOn < today) throw invalidField('/expiresOn', 'Choose today or a later day');
  if (expiresOn > addDays(today, LONGEST_DAYS))
    throw invalidField('/expiresOn', `Choose a day within ${LONGEST_DAYS} days`);
  return endOfDayIn(brewery.timeZone, expiresOn);
}

/**
 * Asked again under the same id (the answer was lost), it gives a new token for the same link: the
 * first one cannot be told again, since only its hash is stored.
 */
export async function makeShareLink(
  hands: Hands,
  member: Member,
  chainId: string,
  { id, name, expiresOn, showPrices }: ShareLinkRequest,
): Promise<ShareLinkMade> {
  const token = newToken();
  await changeBoard(
    hands,
    member,
    [],
    async ({ tx, board, now }) => {
      const { name: chainName } = one(board.chains, chainId);
      const facts = { name, showPrices, expiresAt: endOf(member, expiresOn, now) };
      const place = { breweryId: member.brewery.id, chainId, createdBy: member.person.id };
      const wished = { id, ...facts, ...place, tokenHash: hashToken(token) };
      const made = await tx
        .insert(shareLink)
        .values({ ...wished, createdAt: now })
        .onConflictDoNothing({ target: shareLink.id })
        .returning({ id: shareLink.id });
      if (made.length === 0) {
        await renewToken(tx, wished);
        return null;
      }
      const after = { name, expiresOn, showPrices };
      const what = `Shared ${chainName} by a link: ${name}`;
      return { what, before: null, after, touches: [chainId] };
    },
    'archived-too',
  );
  return { ...(await readShareLink(hands.db, member, id)), token };
}

/** Of a link that stands as it was wished for; one of the same id that does not is another one. */
async function renewToken(
  tx: Tx,
  { tokenHash, ...wished }: typeof shareLink.$inferInsert,
): Promise<void> {
  const { id, breweryId, chainId, createdBy, name, showPrices = false, expiresAt } = wished;
  const renewed = await tx
    .update(shareLink)
    .set({ tokenHash })
    .where(
      and(
        eq(shareLink.id, id),
        eq(shareLink.breweryId, breweryId),
        eq(shareLink.chainId, chainId),
        eq(shareLink.createdBy, createdBy),
        eq(shareLink.name, name),
        eq(shareLink.showPrices, showPrices),
        eq(shareLink.expiresAt, expiresAt),
        isNull(shareLink.withdrawnAt),
      ),
    )
    .returning({ id: shareLink.id });
  if (renewed.length === 0)
    throw problem('already-exists', { detail: 'This id is in use: make a new one' });
}

export async function editShareLink(
  hands: Hands,
  member: Member,
  id: string,
  version: number,
  { expiresOn, ...facts }: ShareLinkPatch,
): Promise<ShareLink> {
  await changeBoard(
    hands,
    member,
    [],
    async ({ tx, now }) => {
      const row = await lockLink(tx, member, id);
      const before = await readShareLink(tx, member, id);
      demandVersion(version, row.version, before);
      if (row.withdrawnAt !== null) throw problem('in-use', { detail: 'It was withdrawn' });
      const expiresAt = expiresOn === undefined ? row.expiresAt : endOf(member, expiresOn, now);
      await tx
        .update(shareLink)
        .set({ ...facts, expiresAt, version: sql`${shareLink.version} + 1` })
        .where(eq(shareLink.id, id));
      const after = { ...facts, ...(expiresOn !== undefined && { expiresOn }) };
      return { what: `Changed the link ${row.name}`, before, after, touches: [row.chainId] };
    },
    'archived-too',
  );
  return readShareLink(hands.db, member, id);
}

/** The row stays, so that the link says that it is no longer good. */
export async function withdrawShareLink(hands: Hands, member: Member, id: string): Promise<void> {
  await changeBoard(
    hands,
    member,
    [],
    async ({ tx, now }) => {
      const row = await lockLink(tx, member, id);
      if (row.withdrawnAt !== null) return null;
      await tx
        .update(shareLink)
        .set({ withdrawnAt: now, version: sql`${shareLink.version} + 1` })
        .where(eq(shareLink.id, id));
      const before = { name: row.name };
      return { what: `Withdrew the link ${row.name}`, before, after: null, touches: [row.chainId] };
    },
    'archived-too',
  );
}

async function lockLink(tx: Tx, { brewery }: Member, id: string): Promise<Row> {
  const [row] = await tx
    .select()
    .from(shareLink)
    .where(and(eq(shareLink.breweryId, brewery.id), eq(shareLink.id, id)))
    .for('update');
  if (!row) throw notFound();
  return row;
}
