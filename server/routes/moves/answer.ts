import type { Moved } from '#shared/api/move.ts';
import type { change } from '../../db/schema/change.ts';
import { problem } from '../../problems.ts';
import type { EditSide } from '../../record/difference.ts';
import type { Hand } from '../board/hand.ts';
import { newestOwn } from './newest.ts';
import type { Side } from './standing.ts';

type Told = Pick<Moved, 'changeId' | 'what' | 'revision'> &
  Partial<Pick<Moved, 'batches' | 'chains' | 'removedChainIds' | 'shifted' | 'cleared'>> & {
    /** What can be undone and redone next, where it is known without asking. */
    own?: Pick<Moved, 'undo' | 'redo'>;
  };

export async function answerMove({ tx, member }: Hand, told: Told): Promise<Moved> {
  const { own, ...rest } = told;
  const next = own ?? (await newestOwn(tx, member.seasonId, member.person.id));
  return {
    batches: [],
    chains: [],
    removedChainIds: [],
    shifted: [],
    cleared: [],
    ...rest,
    ...next,
  };
}

/** The answer of a change that was made already, its rows as they are now. */
export async function answerAgain(hand: Hand, made: typeof change.$inferSelect): Promise<Moved> {
  const { member, board } = hand;
  if (made.seasonId !== member.seasonId || made.personId !== member.person.id)
    throw problem('already-exists', { detail: 'This id is in use: make a new one' });
  if (isEdit(made.after)) return answerEditAgain(hand, made);
  const [before, after] = [made.before as Side, made.after as Side];
  const { chain } = after;
  return answerMove(hand, {
    changeId: made.ofChange ?? made.id,
    what: made.what,
    revision: board.season.revision,
    batches: board.batches.filter(({ id }) => made.touches.includes(id)),
    chains: board.chains.filter(({ id }) => id === chain?.id),
    removedChainIds: before.chain ? [before.chain.id] : [],
    shifted: shiftedBetween(before, after),
    cleared: clearedBetween(before, after),
  });
}

const isEdit = (after: unknown): boolean =>
  typeof after === 'object' && after !== null && 'rows' in after;

function answerEditAgain(hand: Hand, made: typeof change.$inferSelect): Promise<Moved> {
  const { board } = hand;
  const touched = ({ id }: { id: string }) => made.touches.includes(id);
  const left = new Set(board.chains.map(({ id }) => id));
  const chains = Object.keys((made.before as EditSide).rows.chain ?? {});
  return answerMove(hand, {
    changeId: made.ofChange ?? made.id,
    what: made.what,
    revision: board.season.revision,
    batches: board.batches.filter(touched),
    chains: board.chains.filter(touched),
    removedChainIds: chains.filter((id) => !left.has(id)),
  });
}

export function shiftedBetween(before: Side, after: Side): Moved['shifted'] {
  return after.batches.flatMap(({ id, brewOn }) => {
    const was = before.batches.find((row) => row.id === id);
    return was && was.brewOn !== brewOn ? [{ batchId: id, from: was.brewOn, to: brewOn }] : [];
  });
}

function clearedBetween(before: Side, after: Side): string[] {
  const settled = ({ link }: Side['batches'][number]) =>
    link.takenOn !== null || link.keepL !== null || link.keepWhole || link.acceptance !== null;
  return after.batches.flatMap((row) => {
    const was = before.batches.find(({ id }) => id === row.id);
    return was && settled(was) && !settled(row) ? [row.id] : [];
  });
}
