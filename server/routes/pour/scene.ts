import { and, eq } from 'drizzle-orm';
import { pourFound, type PourState } from '#shared/api/pour.ts';
import { pourStanding, type PourStanding } from '#shared/pour/standing.ts';
import type { Member } from '../../auth/whoAsks.ts';
import { batch } from '../../db/schema/chain.ts';
import type { Answer, Asked } from '../../http/operation.ts';
import { notFound, problem } from '../../problems.ts';
import { dayIn } from '../../today.ts';
import type { Said } from '../../record/recordEdit.ts';
import { changeBoard } from '../board/changeBoard.ts';
import type { Hand } from '../board/hand.ts';
import { newestRun, presented, runOf } from './load.ts';
import type { RunRows } from './rows.ts';
import { happenedAt } from './times.ts';

/** A run under the season's lock, with the board that it is on. */
export interface Scene extends RunRows {
  hand: Hand;
}

/** What was done; null: it had been done already. */
export type RunCommand = (scene: Scene) => Promise<Said | null>;

/** The newest run of a batch of this brewery, in whatever season, with the server's clock. */
export async function readPour(asked: Asked<unknown>, { brewery }: Member): Promise<PourState> {
  const batchId = asked.params.id ?? '';
  const [known] = await asked.db
    .select({ id: batch.id })
    .from(batch)
    .where(and(eq(batch.breweryId, brewery.id), eq(batch.id, batchId)));
  if (!known) throw notFound();
  return pourStateOf(asked, batchId);
}

async function pourStateOf(
  asked: Pick<Asked<unknown>, 'db' | 'clock'>,
  batchId: string,
): Promise<PourState> {
  const rows = await newestRun(asked.db, batchId);
  return {
    run: rows && (await presented(asked.db, rows)),
    now: asked.clock.now().toISOString(),
  };
}

/** A command on the board that has to do with a pour; the answer is the run as it left it. */
export async function answerPour(
  asked: Asked<unknown>,
  member: Member,
  command: (hand: Hand, batchId: string) => Promise<Said | null>,
): Promise<Answer> {
  const batchId = asked.params.id ?? '';
  await changeBoard(asked, member, 'all', (hand) => {
    if (!hand.board.batches.some(({ id }) => id === batchId)) throw notFound();
    return command(hand, batchId);
  });
  return { body: await pourStateOf(asked, batchId) };
}

/** A command on one run, by whoever. */
export const onRun = (
  asked: Asked<{ runId: string }>,
  member: Member,
  command: RunCommand,
): Promise<Answer> =>
  answerPour(asked, member, async (hand, batchId) =>
    command({ hand, ...(await runOf(hand.tx, batchId, asked.body.runId)) }),
  );

/** A command that only the one who holds the run may give, while it is open. */
export const byHolder = (
  asked: Asked<{ runId: string }>,
  member: Member,
  command: RunCommand,
): Promise<Answer> =>
  onRun(asked, member, async (scene) => {
    await demandHeld(scene);
    demandOpenRun(scene);
    return command(scene);
  });

/** A step may also be taken after the pour, while the fermenter is closed. */
export const byHolderToTheEnd = (
  asked: Asked<{ runId: string }>,
  member: Member,
  command: RunCommand,
): Promise<Answer> =>
  onRun(asked, member, async (scene) => {
    await demandHeld(scene);
    if (scene.run.state === 'left') demandOpenRun(scene);
    return command(scene);
  });

/** The second person follows; to go on they take the run over. */
export async function demandHeld(scene: Scene): Promise<void> {
  const { run, hand } = scene;
  if (run.openedBy === hand.member.person.id) return;
  const current = await presented(hand.tx, scene);
  throw problem('pour-held', { detail: `${current.heldBy.name} has it in hand`, current });
}

export function demandOpenRun({ run }: RunRows): void {
  if (run.state !== 'open')
    throw problem('pour-over', {
      detail: run.state === 'poured' ? 'The wort is poured' : 'The run was left: open it again',
    });
}

/** How the pour stood at a moment, by the readings that were taken until then. */
export function standingAt(scene: Scene, at: Date): PourStanding {
  const { hand, run, readings } = scene;
  const standing = pourStanding({
    board: hand.board,
    batchId: run.batchId,
    at: at.getTime(),
    day: dayIn(hand.member.brewery.timeZone, at),
    readings: countedUntil(readings, at).map((row) => ({
      at: happenedAt(row).getTime(),
      c: row.temperatureC,
    })),
    coolantC: pourFound.parse(run.steps).coolantC,
    units: hand.member.brewery.units,
  });
  if (!standing) throw problem('pour-over', { detail: 'The batch stands on no shelf any more' });
  return standing;
}

/** Readings that count, until a moment. */
export const countedUntil = (readings: RunRows['readings'], at: Date): RunRows['readings'] =>
  readings
    .filter((row) => row.withdrawnAt === null && happenedAt(row).getTime() <= at.getTime())
    .sort((a, b) => happenedAt(a).getTime() - happenedAt(b).getTime());
