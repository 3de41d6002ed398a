import { eq, sql } from 'drizzle-orm';
import type { PourRequest } from '#shared/api/pour.ts';
import type { Batch } from '#shared/api/batch.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import { leaveAt } from '#shared/pour/leave.ts';
import { endsLeave, objectionsOf } from '#shared/pour/standing.ts';
import { format } from '#shared/units/quantity.ts';
import { surplus } from '../../db/schema/cake.ts';
import { pourEvent, pourRun } from '../../db/schema/pour.ts';
import { demandMade } from '../../http/create.ts';
import { invalidField, problem } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import { renewFollowed } from '../batch-record/followed.ts';
import { setStage } from '../batches/stage.ts';
import { one } from '../board/find.ts';
import { presentRun, type Judgement } from './present.ts';
import { countedUntil, standingAt, type RunCommand, type Scene } from './scene.ts';
import { asTold, happenedAt } from './times.ts';

/**
 * Records that the wort was poured, judged by its own time. What happened is recorded whatever was
 * said before; one without leave is recorded as that.
 */
export const recordPour =
  (body: PourRequest): RunCommand =>
  async (scene) => {
    const { hand, run } = scene;
    if (scene.pour?.id === body.id) return null;
    if (scene.pour) throw problem('pour-over', { detail: 'The wort is poured' });
    const batch = one(hand.board.batches, run.batchId);
    const at = happenedAt(asTold(body, hand.now));
    const { judged, clearanceId } = judgedAt(scene, at);
    await insertPour(scene, body, at, { judged, clearanceId });
    await hand.tx
      .update(pourRun)
      .set({ state: 'poured', closedAt: at, step: 'after', version: sql`${pourRun.version} + 1` })
      .where(eq(pourRun.id, run.id));
    await brew(scene, batch, body, at);
    await renewFollowed(hand.tx, run.batchId);
    await putBy(scene, body, at);
    return {
      stays: true,
      what: sentence(scene, batch, judged, clearanceId !== null),
      touches: [run.batchId, ...(run.cakeBatchId ? [run.cakeBatchId] : [])],
      before: null,
      after: { pour: body.id, judged, cleared: clearanceId !== null },
    };
  };

interface Judged {
  judged: Judgement;
  /** The leave that held at that moment; null: there was none. */
  clearanceId: string | null;
}

async function insertPour(
  scene: Scene,
  body: PourRequest,
  at: Date,
  { judged, clearanceId }: Judged,
): Promise<void> {
  const { hand, run } = scene;
  demandMade(
    await hand.tx
      .insert(pourEvent)
      .values({
        id: body.id,
        runId: run.id,
        batchId: run.batchId,
        cakeBatchId: run.cakeBatchId,
        ...asTold(body, hand.now),
        personId: hand.member.person.id,
        readingId: countedUntil(scene.readings, at).at(-1)?.id ?? null,
        clearanceId,
        volumeL: body.volumeL,
        og: body.og,
        typed: body.typed,
        judged,
        cleared: clearanceId !== null,
      })
      .onConflictDoNothing({ target: pourEvent.id })
      .returning({ id: pourEvent.id }),
  );
}

function judgedAt(scene: Scene, at: Date): Judged {
  const standing = standingAt(scene, at);
  const run = presentRun(scene, (personId) => personId);
  const leave = leaveAt(run, at.getTime(), endsLeave(standing));
  return {
    judged: {
      verdict: standing.verdict,
      findings: objectionsOf(standing),
      readingC: standing.wort.readingC,
    },
    clearanceId: leave?.id ?? null,
  };
}

/** The batch ferments from the day of the pour, with what was read; the cake is poured. */
async function brew({ hand }: Scene, batch: Batch, body: PourRequest, at: Date): Promise<void> {
  if (batch.stage !== 'pencilled' && batch.stage !== 'fermenting') return;
  const brewedOn = dayIn(hand.member.brewery.timeZone, at);
  // What was read by hand meanwhile stands where the pour says nothing of it.
  const volumeL = body.volumeL ?? batch.read.volumeL;
  const og = body.og ?? batch.read.og;
  await setStage(batch.id, batch.version, { stage: 'fermenting', brewedOn, volumeL, og })(hand);
}

/** What is left of the cake is a jar to be, or dumped. */
async function putBy({ hand, run }: Scene, body: PourRequest, at: Date): Promise<void> {
  if (!body.surplus || run.cakeBatchId === null) return;
  const { board, member, tx } = hand;
  const source = one(board.batches, run.cakeBatchId);
  const chain = board.chains.find(({ id }) => id === source.chainId);
  const generation = judgeBoard(board).generation.get(source.id);
  if (!chain || generation === undefined)
    throw invalidField('/surplus', 'The generation of this cake is not known');
  demandMade(
    await tx
      .insert(surplus)
      .values({
        ...body.surplus,
        breweryId: member.brewery.id,
        cakeBatchId: source.id,
        yeastId: chain.yeastId,
        generation,
        day: dayIn(member.brewery.timeZone, at),
        personId: member.person.id,
        createdAt: hand.now,
      })
      .onConflictDoNothing({ target: surplus.id })
      .returning({ id: surplus.id }),
  );
}

function sentence({ hand, run }: Scene, batch: Batch, judged: Judgement, cleared: boolean): string {
  const { board, member } = hand;
  const cake = board.batches.find(({ id }) => id === run.cakeBatchId);
  const onto = cake ? ` onto the cake of ${cake.name}` : '';
  const { units } = member.brewery;
  const warm =
    judged.readingC === null ? '' : ` at ${format('temperature', judged.readingC, units)}`;
  return `Poured ${batch.name}${onto}${warm}${cleared ? '' : ', without leave'}`;
}

/** A head brewer's reason for a pour without leave. */
export const signPour =
  (reason: string): RunCommand =>
  async ({ hand, run, pour }) => {
    if (!pour) throw problem('not-cleared', { detail: 'Nothing was poured yet' });
    if (pour.cleared) throw problem('not-cleared', { detail: 'There was leave to pour' });
    if (pour.signedAt !== null) {
      if (pour.reason === reason) return null;
      throw problem('not-cleared', { detail: 'It was signed already' });
    }
    await hand.tx
      .update(pourEvent)
      .set({
        signedBy: hand.member.person.id,
        signedAt: hand.now,
        reason,
        version: sql`${pourEvent.version} + 1`,
      })
      .where(eq(pourEvent.id, pour.id));
    return {
      what: `Signed the pour of ${one(hand.board.batches, run.batchId).name}: ${reason}`,
      touches: [run.batchId],
      before: null,
      after: { pour: pour.id, reason },
    };
  };
