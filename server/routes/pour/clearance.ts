import { and, eq, sql } from 'drizzle-orm';
import type { OverrideAnswer, OverrideRequest } from '#shared/api/pour.ts';
import { rulesOf } from '#shared/chain/boardLink.ts';
import { objectionsOf, type PourStanding } from '#shared/pour/standing.ts';
import { pourClearance } from '../../db/schema/pour.ts';
import { demandMade } from '../../http/create.ts';
import { canAcceptHolds } from '../../policies.ts';
import { notFound, problem } from '../../problems.ts';
import { one } from '../board/find.ts';
import { countedUntil, demandOpenRun, standingAt, type RunCommand, type Scene } from './scene.ts';

const MINUTE = 60_000;

/** Asks a head brewer for leave where something holds; one who asks answers at once, with a reason. */
export const askOverride =
  (body: OverrideRequest): RunCommand =>
  async (scene) => {
    const { tx, member, now } = scene.hand;
    if (scene.clearances.some(({ id }) => id === body.id)) return null;
    const standing = standingAt(scene, now);
    demandOverridable(standing);
    const answers = canAcceptHolds(member) && body.reason !== null;
    demandMade(
      await tx
        .insert(pourClearance)
        .values({
          id: body.id,
          runId: scene.run.id,
          kind: 'override',
          readingId: countedUntil(scene.readings, now).at(-1)?.id ?? null,
          askedBy: member.person.id,
          askedAt: now,
          findings: objectionsOf(standing),
          ...(answers && answered(scene, 'granted', body.reason ?? '')),
        })
        .onConflictDoNothing({ target: pourClearance.id })
        .returning(),
    );
    const name = nameIn(scene);
    return said(
      scene,
      body.id,
      answers
        ? `Gave leave to pour ${name}: ${body.reason}`
        : `Asked for leave to pour ${name}${whyNot(standing)}`,
    );
  };

/** The head brewer's answer, from wherever they are. */
export const answerOverride =
  (body: OverrideAnswer): RunCommand =>
  async (scene) => {
    const asked = scene.clearances.find(({ id }) => id === body.clearanceId);
    if (!asked || asked.kind !== 'override') throw notFound();
    if (asked.answer !== null) {
      if (asked.answer === body.answer && asked.reason === body.reason) return null;
      throw problem('not-cleared', { detail: 'It was answered already' });
    }
    demandOpenRun(scene);
    if (body.answer === 'granted') demandOverridable(standingAt(scene, scene.hand.now));
    await scene.hand.tx
      .update(pourClearance)
      .set({
        ...answered(scene, body.answer, body.reason),
        version: sql`${pourClearance.version} + 1`,
      })
      .where(and(eq(pourClearance.runId, scene.run.id), eq(pourClearance.id, asked.id)));
    const did = body.answer === 'granted' ? 'Gave leave to pour' : 'Refused leave to pour';
    return said(scene, asked.id, `${did} ${nameIn(scene)}: ${body.reason}`);
  };

function answered({ hand }: Scene, answer: 'granted' | 'refused', reason: string) {
  const { board, member, now } = hand;
  const until = new Date(now.getTime() + rulesOf(board).readingMinutes * MINUTE);
  return {
    answer,
    answeredBy: member.person.id,
    answeredAt: now,
    reason,
    expiresAt: answer === 'granted' ? until : null,
  };
}

/** Dead yeast, an allergen, a wild culture or an unread temperature: nobody takes these on. */
function demandOverridable(standing: PourStanding): void {
  if (standing.overridable) return;
  const current = objectionsOf(standing);
  if (standing.clear)
    throw problem('not-cleared', {
      detail: 'Nothing holds: read the temperature and pour',
      current,
    });
  const hold = current.find(({ verdict }) => verdict === 'hold');
  throw problem('not-cleared', {
    detail: `Nobody can override this: ${hold?.because ?? 'something holds'}`,
    current,
  });
}

const nameIn = ({ hand, run }: Scene): string => one(hand.board.batches, run.batchId).name;

const whyNot = (standing: PourStanding): string => {
  const hold = objectionsOf(standing).find(({ verdict }) => verdict === 'hold');
  return hold ? ` (${hold.title})` : '';
};

const said = ({ run }: Scene, id: string, what: string) => ({
  what,
  touches: [run.batchId],
  before: null,
  after: { pourClearance: id },
});
