import { eq, sql } from 'drizzle-orm';
import type { Batch } from '#shared/api/batch.ts';
import { pourFound, type PourStepRequest } from '#shared/api/pour.ts';
import { indexBoard } from '#shared/chain/board.ts';
import { pourRun } from '../../db/schema/pour.ts';
import { demandMade } from '../../http/create.ts';
import { invalidField, problem } from '../../problems.ts';
import type { Said } from '../../record/recordEdit.ts';
import { one } from '../board/find.ts';
import type { Hand } from '../board/hand.ts';
import { newestRun, presented } from './load.ts';
import type { RunCommand } from './scene.ts';

/** Takes a link in hand. One run a link: the second person is told who holds it. */
export async function openRun(hand: Hand, batchId: string, id: string): Promise<Said | null> {
  const { tx, board, member, now } = hand;
  const before = await newestRun(tx, batchId);
  if (before?.run.id === id) return null;
  if (before?.run.state === 'open') {
    const current = await presented(tx, before);
    throw problem('pour-held', { detail: `${current.heldBy.name} has it in hand`, current });
  }
  const batch = one(board.batches, batchId);
  const cake = indexBoard(board).predecessor(batchId);
  demandPourable(batch, cake);
  demandMade(
    await tx
      .insert(pourRun)
      .values({
        id,
        breweryId: member.brewery.id,
        seasonId: board.season.id,
        batchId,
        cakeBatchId: cake?.id ?? null,
        openedBy: member.person.id,
        openedAt: now,
        step: cake ? 'racked' : 'clean',
      })
      .onConflictDoNothing({ target: pourRun.id })
      .returning({ id: pourRun.id }),
  );
  const onto = cake ? ` onto the cake of ${cake.name}` : '';
  return {
    what: `Began the pour of ${batch.name}${onto}`,
    touches: [batchId],
    before: null,
    after: { pourRun: id },
  };
}

function demandPourable({ name, stage, chainId }: Batch, cake: Batch | null): void {
  if (stage !== 'pencilled')
    throw problem('pour-over', { detail: `${name} is ${stage}: its wort is poured` });
  if (chainId === null) throw problem('pour-over', { detail: `Put ${name} on a shelf first` });
  if (cake?.stage === 'pencilled')
    throw problem('pour-over', {
      detail: `${cake.name} comes before it and is not brewed yet: say first when it was brewed`,
    });
}

/** To another step, forward or back, with what the steps found. */
export const toStep =
  ({ step, found }: PourStepRequest): RunCommand =>
  async ({ hand, run }) => {
    if (run.state === 'poured' && step !== 'after')
      throw invalidField('/step', 'The wort is poured: there is no way back');
    if (run.cakeBatchId === null && (step === 'racked' || step === 'cake' || step === 'keep'))
      throw invalidField('/step', 'No cake is before this batch');
    const steps = { ...pourFound.parse(run.steps), ...found };
    await hand.tx
      .update(pourRun)
      .set({ step, steps, version: sql`${pourRun.version} + 1` })
      .where(eq(pourRun.id, run.id));
    return { what: '', touches: [] };
  };

/** Another person goes on with it, for instance on another telephone. */
export const takeOver: RunCommand = async ({ hand, run }) => {
  const { tx, board, member } = hand;
  if (run.openedBy === member.person.id) return null;
  if (run.state !== 'open') throw problem('pour-over');
  await tx
    .update(pourRun)
    .set({ openedBy: member.person.id, version: sql`${pourRun.version} + 1` })
    .where(eq(pourRun.id, run.id));
  return {
    what: `Took over the pour of ${one(board.batches, run.batchId).name}`,
    touches: [run.batchId],
    before: { heldBy: run.openedBy },
    after: { heldBy: member.person.id },
  };
};

/** Ends a run without a pour. Its readings stay. */
export const leaveRun: RunCommand = async ({ hand, run }) => {
  const { tx, board, now } = hand;
  if (run.state !== 'open') return null;
  await tx
    .update(pourRun)
    .set({ state: 'left', closedAt: now, version: sql`${pourRun.version} + 1` })
    .where(eq(pourRun.id, run.id));
  return {
    what: `Left the pour of ${one(board.batches, run.batchId).name}`,
    touches: [run.batchId],
    before: { pourRun: run.id },
    after: null,
  };
};
