import type { CommentAbout, SaidVerdict } from '#shared/api/comment.ts';
import { indexBoard } from '#shared/chain/board.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import type { Member } from '../../auth/whoAsks.ts';
import type { Tx } from '../../db/client.ts';
import { invalidField, notFound } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { loadBoardRows } from '../board/load.ts';
import type { TalkedChain } from './find.ts';

interface Speaking {
  tx: Tx;
  member: { brewery: Pick<Member['brewery'], 'id' | 'timeZone'> };
  chain: Pick<TalkedChain, 'id' | 'seasonId'>;
  now: Date;
}

/** Sees that there is what a comment speaks of, and what a link says now; null of all else. */
export async function saidOf(
  { tx, member, chain, now }: Speaking,
  about: CommentAbout,
): Promise<SaidVerdict | null> {
  if (about.kind === 'chain') return null;
  const rows = await loadBoardRows(tx, member.brewery.id, chain.seasonId);
  if (!rows) throw notFound();
  const board = { ...rows, today: dayIn(member.brewery.timeZone, now) };
  const batch = indexBoard(board)
    .batchesOf(chain.id)
    .find(({ id }) => id === about.batchId);
  if (!batch) throw invalidField('/about/batchId', 'Choose a batch that stands on this shelf');
  if (about.kind === 'batch') return null;
  const link = judgeBoard(board).links.get(batch.id);
  if (!link) throw invalidField('/about/batchId', 'No cake goes under this batch');
  const counted = link.findings.filter((finding) => finding.verdict === link.verdict);
  return {
    verdict: link.verdict,
    findings: counted.length,
    reason: link.findings[0]?.title ?? '',
  };
}
