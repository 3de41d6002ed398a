import { eq } from 'drizzle-orm';
import type { CakeCheck, CakeCheckWrite } from '#shared/api/cakeCheck.ts';
import { measuredOf } from '#shared/cake/measured.ts';
import { tellCheck } from '#shared/record/readings.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { cake, cakeCheck } from '../../db/schema/cake.ts';
import { demandVersion } from '../../http/etag.ts';
import { notFound, problem } from '../../problems.ts';
import { changeBoard } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { one } from '../board/find.ts';
import { checkOf } from './find.ts';
import { presentCheck } from './present.ts';
import { findBatch, type Scene } from './scene.ts';

interface Named {
  batchId: string | undefined;
  /** 0: there is no judgement yet. */
  version: number;
}

/** Judges a cake, or judges it anew; what was measured stands in place of the estimate at once. */
export async function signCheck(
  scene: Scene,
  member: Member,
  { batchId = '', version }: Named,
  body: CakeCheckWrite,
): Promise<CakeCheck> {
  const known = await findBatch(scene.db, member, batchId);
  const where = { ...member, seasonId: known.seasonId };
  await changeBoard(scene, where, [], async (hand) => {
    const { batch, before } = await inHand(hand, batchId, version);
    const next = (before?.version ?? 0) + 1;
    const signed = { version: next, signedBy: member.person.id, signedAt: hand.now };
    await hand.tx
      .insert(cakeCheck)
      .values({ ...body, ...signed, batchId, breweryId: member.brewery.id })
      .onConflictDoUpdate({ target: cakeCheck.batchId, set: { ...body, ...signed } });
    await measure(hand, batchId, body);
    return { what: tellCheck(batch.name, before, body), touches: [batchId] };
  });
  const found = await checkOf(scene.db, batchId);
  if (!found) throw notFound();
  return presentCheck(found.row, found.author);
}

/** Takes a judgement back: the cake is as if nobody had looked. */
export async function withdrawCheck(
  scene: Scene,
  member: Member,
  { batchId = '', version }: Named,
): Promise<void> {
  const known = await findBatch(scene.db, member, batchId);
  await changeBoard(scene, { ...member, seasonId: known.seasonId }, [], async (hand) => {
    const { batch, before } = await inHand(hand, batchId, version);
    if (!before) throw notFound();
    await hand.tx.delete(cakeCheck).where(eq(cakeCheck.batchId, batchId));
    await measure(hand, batchId, null);
    return { what: `Took the cake check of ${batch.name} back`, touches: [batchId] };
  });
}

async function inHand({ tx, board }: Hand, batchId: string, version: number) {
  const batch = one(board.batches, batchId);
  if (batch.cake === null)
    throw problem('in-use', { detail: `${batch.name} is not brewed yet: it has no cake to judge` });
  const found = await checkOf(tx, batchId);
  const before = found ? presentCheck(found.row, found.author) : null;
  demandVersion(version, before?.version ?? 0, before);
  return { batch, before };
}

async function measure({ tx }: Hand, batchId: string, body: CakeCheckWrite | null): Promise<void> {
  await tx
    .update(cake)
    .set({ measured: body && measuredOf(body) })
    .where(eq(cake.batchId, batchId));
}
