import type { Board } from '#shared/api/board.ts';
import { isPencilled } from '#shared/chain/board.ts';
import { judgeGaps, rankGaps } from '#shared/chain/gaps.ts';
import { indexed } from './indexed.ts';
import { walkOf } from './places.ts';
import { lockWords } from './words.ts';

/** Judges every place for a batch, once; the pointer then only looks the answers up. */
export function judgedPlaces(board: Board, batchId: string) {
  const gaps = judgeGaps(board, batchId).filter((gap) => isWithinReach(board, batchId, gap));
  const ranked = rankGaps(gaps);
  const locked = gaps.filter((gap) => gap.locked !== null);
  return {
    gaps: new Map(gaps.map((gap) => [gap.key, gap])),
    ranked,
    locks: new Map(locked.map((gap) => [gap.key, lockWords(board, gap)])),
    walk: walkOf(board, ranked, batchId),
  };
}

/** A guest moves within a chain; its gaps bear its id. */
function isWithinReach(board: Board, batchId: string, { key }: { key: string }): boolean {
  if (board.me.can.moveAcross) return true;
  const chainId = board.batches.find(({ id }) => id === batchId)?.chainId ?? null;
  return chainId !== null && key.startsWith(`${chainId}:`);
}

export type JudgedPlaces = ReturnType<typeof judgedPlaces>;

/** The places of the batch that was asked for last, so that a press can judge them before the lift. */
export function createForesight(): (board: Board, batchId: string) => JudgedPlaces {
  let last: { board: Board; batchId: string; places: JudgedPlaces } | null = null;
  return (board, batchId) => {
    if (last?.board !== board || last.batchId !== batchId)
      last = { board, batchId, places: judgedPlaces(board, batchId) };
    return last.places;
  };
}

/** Shelves of one slice: a few milliseconds, also before the engine has been compiled. */
const SLICE = 3;
const ROUNDS = 3;

/**
 * Judges the places of some batches on a few shelves at a time, so that the first lift finds the
 * engine compiled. Each step of the answer is one slice.
 */
export function* rehearsal(board: Board): Generator<void> {
  const { chains, batchesOf } = indexed(board);
  for (let step = 0; step * SLICE < chains.length * ROUNDS; step += 1) {
    const from = (step * SLICE) % chains.length;
    const shelves = chains.slice(from, from + SLICE);
    const batches = shelves.flatMap(({ id }) => batchesOf(id));
    const batch = batches.find(isPencilled);
    if (batch) rankGaps(judgeGaps({ ...board, chains: shelves, batches }, batch.id));
    yield;
  }
}
