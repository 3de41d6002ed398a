import { eq, sql } from 'drizzle-orm';
import type { Talked } from '#shared/record/talk.ts';
import type { Comment, CommentCreate, CommentPatch } from '#shared/api/comment.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Clock } from '../../clock.ts';
import type { Db, Tx } from '../../db/client.ts';
import { inTransaction } from '../../db/inTransaction.ts';
import { comment, commentSeen } from '../../db/schema/talk.ts';
import { demandMade, isRepeated } from '../../http/create.ts';
import { demandVersion } from '../../http/etag.ts';
import { canRemoveComments } from '../../policies.ts';
import { problem } from '../../problems.ts';
import { demandOpen } from '../board/changeBoard.ts';
import { lockSeason } from '../board/locks.ts';
import { raiseRevision } from '../board/record.ts';
import {
  findChain,
  findComment,
  selectComments,
  type CommentRow,
  type TalkedChain,
} from './find.ts';
import { presentComment } from './present.ts';
import { recordTalk } from './record.ts';
import { saidOf } from './said.ts';

interface Scene {
  db: Db;
  clock: Clock;
}

interface Talking {
  tx: Tx;
  chain: TalkedChain;
  now: Date;
}

/** Null: nothing new was said. */
type Change = (talking: Talking) => Promise<{ id: string; did: Talked | null }>;

/** Changes a chain's talk, records that, and lets everybody on the season's board know. */
function talk(
  { db, clock }: Scene,
  member: Member,
  chainId: string | undefined,
  change: Change,
): Promise<Comment> {
  return inTransaction(db, async (tx) => {
    const { seasonId } = await findChain(tx, member, chainId);
    await lockSeason(tx, seasonId);
    const chain = await findChain(tx, member, chainId);
    demandOpen({ season: chain });
    const now = clock.now();
    const { id, did } = await change({ tx, chain, now });
    const found = await findComment(tx, chain.id, id);
    if (did === null) return presentComment(found);
    await raiseRevision(tx, chain.seasonId);
    await recordTalk({ tx, member, chain, now }, found, did);
    return presentComment(found);
  });
}

export const addComment = (
  scene: Scene,
  member: Member,
  chainId: string | undefined,
  body: CommentCreate,
): Promise<Comment> =>
  talk(scene, member, chainId, async ({ tx, chain, now }) => {
    const [before] = await selectComments(tx).where(eq(comment.id, body.id));
    const known = before?.row.chainId === chain.id ? presentComment(before) : undefined;
    if (isRepeated(known, body)) return { id: body.id, did: null };
    const made = await tx
      .insert(comment)
      .values({
        id: body.id,
        breweryId: member.brewery.id,
        chainId: chain.id,
        about: body.about.kind,
        batchId: body.about.kind === 'chain' ? null : body.about.batchId,
        verdict: await saidOf({ tx, member, chain, now }, body.about),
        personId: member.person.id,
        text: body.text,
        createdAt: now,
      })
      .onConflictDoNothing({ target: comment.id })
      .returning();
    demandMade(made);
    return { id: body.id, did: 'said' };
  });

interface Named {
  chainId: string | undefined;
  commentId: string | undefined;
  version: number;
}

const isOwn = ({ row }: CommentRow, { person }: Member) => row.personId === person.id;

/** Other words for one's own comment, or a removed one put back by whoever may remove it. */
export const editComment = (
  scene: Scene,
  member: Member,
  { chainId, commentId = '', version }: Named,
  patch: CommentPatch,
): Promise<Comment> =>
  talk(scene, member, chainId, async ({ tx, chain, now }) => {
    const found = await findComment(tx, chain.id, commentId);
    if ('text' in patch) {
      if (!isOwn(found, member)) throw problem('not-allowed', { detail: 'Somebody else wrote it' });
    } else demandMayRemove(found, member);
    demandVersion(version, found.row.version, presentComment(found));
    if ('text' in patch && found.row.deletedAt !== null)
      throw problem('in-use', { detail: 'It was removed: put it back first' });
    if ('text' in patch) {
      await write(tx, found, { ...patch, editedAt: now });
      return { id: commentId, did: 'changed' };
    }
    if (found.row.deletedAt === null) return { id: commentId, did: null };
    await write(tx, found, { deletedAt: null });
    return { id: commentId, did: 'put-back' };
  });

/** Takes the words away; that something was said stays. */
export const removeComment = (
  scene: Scene,
  member: Member,
  { chainId, commentId = '', version }: Named,
): Promise<Comment> =>
  talk(scene, member, chainId, async ({ tx, chain, now }) => {
    const found = await findComment(tx, chain.id, commentId);
    demandMayRemove(found, member);
    demandVersion(version, found.row.version, presentComment(found));
    if (found.row.deletedAt !== null) return { id: commentId, did: null };
    await write(tx, found, { deletedAt: now });
    return { id: commentId, did: 'removed' };
  });

function demandMayRemove(found: CommentRow, member: Member): void {
  if (!isOwn(found, member) && !canRemoveComments(member))
    throw problem('not-allowed', { detail: 'Somebody else wrote it' });
}

type Columns = Partial<typeof comment.$inferInsert>;

async function write(tx: Tx, { row }: CommentRow, columns: Columns): Promise<void> {
  await tx
    .update(comment)
    .set({ ...columns, version: sql`${comment.version} + 1` })
    .where(eq(comment.id, row.id));
}

/** Remembers how far somebody has read; never less far than before. */
export async function markSeen(
  { db }: Pick<Scene, 'db'>,
  member: Member,
  chainId: string | undefined,
  seq: number,
): Promise<void> {
  const chain = await findChain(db, member, chainId);
  await db
    .insert(commentSeen)
    .values({ personId: member.person.id, chainId: chain.id, seq })
    .onConflictDoUpdate({
      target: [commentSeen.personId, commentSeen.chainId],
      set: { seq: sql`greatest(${commentSeen.seq}, excluded.seq)` },
    });
}
