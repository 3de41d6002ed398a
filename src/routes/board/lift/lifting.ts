import type { Board } from '#shared/api/board.ts';
import { judgeGaps, rankGaps } from '#shared/chain/gaps.ts';
import { OFFLINE_WORDS } from './failure.ts';
import type { Intent } from './keys.ts';
import type { Lifted, LiftStore } from './liftState.ts';
import { openOutward } from './openOutward.ts';
import { step, walkOf } from './places.ts';
import type { LiftPorts } from './ports.ts';
import {
  goneWords,
  liftedWords,
  lockWords,
  movedAwayWords,
  putBackWords,
  walkedWords,
} from './words.ts';

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

/** Why a batch cannot be lifted; null where it can. */
export function whyFixed(board: Board, batchId: string): string | null {
  const batch = board.batches.find((row) => row.id === batchId);
  if (!batch) return 'It is no longer on this board';
  if (!board.me.can.moveBatches) return 'Your role reads the board and moves nothing';
  if (batch.stage === 'fermenting') return 'It is fermenting, so it stays where it was poured';
  if (batch.stage === 'racked') return 'It is racked, so it stays where it was poured';
  return batch.stage === 'scrapped' ? 'It is scrapped' : null;
}

export interface Lifting {
  /** The pointer is down on a batch; it is lifted when the pointer has gone a little. */
  press(batchId: string): void;
  liftPressed(): void;
  lift(batchId: string, by: Lifted['by']): void;
  /** The place that the pointer or the keys are on. */
  goOver(key: string | null): void;
  walk(intent: Intent): void;
  cancel(): void;
  /** Ends the lift without a word: the batch is put down. */
  release(): void;
  /** The board changed under a lifted batch. */
  boardChanged(board: Board): void;
}

export function createLifting(store: LiftStore, ports: LiftPorts): Lifting {
  let pressed: string | null = null;
  let letGo = () => {};
  let fold = () => {};

  const release = () => {
    store.set({ lifted: null, over: null, opened: new Set(), isUnfolded: false });
    letGo();
    fold();
    letGo = fold = () => {};
  };

  /** A board that waits for the end of the drag: where the batch is gone, there is nothing to wait for. */
  const arrived = (board: Board) => {
    const { lifted } = store.get();
    if (!lifted || board.batches.some((row) => row.id === lifted.batchId)) return;
    release();
    ports.say(goneWords(lifted.name));
  };

  const lift = (batchId: string, by: Lifted['by']) => {
    const board = ports.board();
    const why = ports.isOnline() ? whyFixed(board, batchId) : OFFLINE_WORDS;
    if (why) return ports.say(why);
    const batch = board.batches.find((row) => row.id === batchId);
    if (!batch) return;
    const places = judgedPlaces(board, batchId);
    if (by === 'pointer') letGo = ports.holdStill(arrived);
    const shape = board.vessels.find((row) => row.id === batch.vesselId)?.shape ?? null;
    const lifted = { batchId, by, name: batch.name, chainId: batch.chainId, shape, ...places };
    store.set({ lifted, over: null, change: null, refusal: null });
    fold = openOutward(store, ports, batchId);
    const best = places.ranked.find((gap) => gap.best);
    ports.say(liftedWords(board, batchId, best));
  };

  const goOver = (key: string | null) => {
    const { lifted, over } = store.get();
    if (!lifted || key === over) return;
    store.set({ over: key });
    const gap = key === null ? undefined : lifted.gaps.get(key);
    if (gap) ports.say(walkedWords(ports.board(), gap, lifted.batchId));
  };

  const cancel = () => {
    const { lifted } = store.get();
    if (!lifted) return;
    release();
    ports.say(putBackWords(ports.board(), lifted.batchId));
    ports.focusBatch(lifted.batchId);
  };

  const boardChanged = (board: Board) => {
    const { lifted, over } = store.get();
    if (!lifted) return;
    const batch = board.batches.find((row) => row.id === lifted.batchId);
    if (!batch || batch.chainId !== lifted.chainId || whyFixed(board, lifted.batchId)) {
      release();
      ports.say(batch ? movedAwayWords(board, batch.id) : goneWords(lifted.name));
      return;
    }
    const places = judgedPlaces(board, lifted.batchId);
    const isStillThere = over !== null && places.walk.ranked.includes(over);
    store.set({ lifted: { ...lifted, ...places }, over: isStillThere ? over : null });
  };

  return {
    press(batchId) {
      pressed = batchId;
    },
    liftPressed() {
      if (pressed !== null) lift(pressed, 'pointer');
    },
    lift,
    goOver,
    cancel,
    release,
    boardChanged,
    walk(intent) {
      const { lifted, over } = store.get();
      if (lifted) goOver(step(lifted.walk, over, intent));
    },
  };
}
