import { eq } from 'drizzle-orm';
import { aboutWords, tellTalk, type Talked } from '#shared/record/talk.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { batch } from '../../db/schema/chain.ts';
import { writeEntry } from '../board/record.ts';
import type { CommentRow, TalkedChain } from './find.ts';

interface Talking {
  tx: Tx;
  member: Member;
  chain: TalkedChain;
  now: Date;
}

/** That something was said, and about what, stands in the record of the chain's season. */
export async function recordTalk(
  { tx, member, chain, now }: Talking,
  { row }: CommentRow,
  did: Talked,
): Promise<void> {
  const name = row.batchId === null ? chain.name : await nameOf(tx, row.batchId);
  await writeEntry(tx, { ...member, seasonId: chain.seasonId }, now, {
    kind: 'edit',
    what: tellTalk(did, aboutWords(row.about, name)),
    before: null,
    after: { comment: row.id },
    touches: [...(row.batchId === null ? [] : [row.batchId]), chain.id, row.id],
  });
}

async function nameOf(tx: Tx, batchId: string): Promise<string> {
  const [row] = await tx.select({ name: batch.name }).from(batch).where(eq(batch.id, batchId));
  return row?.name ?? 'a batch that is gone';
}
