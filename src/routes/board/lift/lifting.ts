import type { Batch } from '#shared/api/batch.ts';
import type { Board } from '#shared/api/board.ts';
import { OFFLINE_WORDS } from './failure.ts';
import type { Intent } from './keys.ts';
import { faceOf, NOTHING_OPEN, type Face, type Lifted } from './liftState.ts';
import type { LiftStore } from './liftStore.ts';
import { openOutward } from './openOutward.ts';
import { createForesight } from './judging.ts';
import { step } from './places.ts';
import type { LiftPorts } from './ports.ts';
import { goneWords, liftedWords, movedAwayWords, putBackWords, walkedWords } from './words.ts';

/** Why a batch cannot be lifted; null where it can. */
export const whyFixed = (board: Board, batchId: string): string | null =>
  whyBatchFixed(
    board,
    board.batches.find((row) => row.id === batchId),
  );

export function whyBatchFixed({ me }: Pick<Board, 'me'>, batch: Batch | undefined): string | null {
  if (!batch) return 'It is no longer on this board';
  if (!me.can.moveBatches) return 'Your role reads the board and moves nothing';
  if (batch.stage === 'fermenting') return 'It is fermenting, so it stays where it was poured';
  if (batch.stage === 'racked') return 'It is racked, so it stays where it was poured';
  return batch.stage === 'scrapped' ? 'It is scrapped' : null;
}

/** What stands open, as it is judged now. */
const judgedAnew = (opened: ReadonlyMap<string, Face>, lifted: Lifted) =>
  new Map(
    [...opened.keys()].flatMap((key) => {
      const face = faceOf(lifted, key);
      return face ? [[key, face] as const] : [];
    }),
  );

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
  const placesOf = createForesight();
  let letGo = () => {};
  let fold = () => {};

  const release = () => {
    store.set({ lifted: null, over: null, isUnfolded: false });
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
    const places = placesOf(board, batchId);
    if (by === 'pointer') letGo = ports.holdStill(arrived);
    const shape = board.vessels.find((row) => row.id === batch.vesselId)?.shape ?? null;
    const lifted = { batchId, by, name: batch.name, chainId: batch.chainId, shape, ...places };
    store.set({ lifted, opened: NOTHING_OPEN, over: null, change: null, refusal: null });
    fold = openOutward(store, ports, batchId);
    const best = places.ranked.find((gap) => gap.best);
    ports.say(liftedWords(board, batchId, best));
  };

  const goOver = (key: string | null) => {
    const { lifted, over, opened } = store.get();
    if (!lifted || key === over) return;
    // The keys may be faster than the gaps open.
    const face = key !== null && !opened.has(key) && faceOf(lifted, key);
    store.set({ over: key, opened: face ? new Map([...opened, [key, face]]) : opened });
    const gap = key === null ? undefined : lifted.gaps.get(key);
    if (!gap) return;
    const words = walkedWords(ports.board(), gap, lifted.batchId);
    if (lifted.by === 'keys') ports.say(words);
    else ports.sayAtRest(words);
  };

  const cancel = () => {
    const { lifted } = store.get();
    if (!lifted) return;
    release();
    ports.say(putBackWords(ports.board(), lifted.batchId));
    ports.focusBatch(lifted.batchId);
  };

  const boardChanged = (board: Board) => {
    const { lifted, over, opened } = store.get();
    if (!lifted) return;
    const batch = board.batches.find((row) => row.id === lifted.batchId);
    if (!batch || batch.chainId !== lifted.chainId || whyFixed(board, lifted.batchId)) {
      release();
      ports.say(batch ? movedAwayWords(board, batch.id) : goneWords(lifted.name));
      return;
    }
    const places = placesOf(board, lifted.batchId);
    const isStillThere = over !== null && places.walk.ranked.includes(over);
    const now = { ...lifted, ...places };
    store.set({ lifted: now, over: isStillThere ? over : null, opened: judgedAnew(opened, now) });
  };

  return {
    press(batchId) {
      pressed = batchId;
      // A press becomes a lift some frames later: the places are judged in between.
      ports.nextFrame(() => placesOf(ports.board(), batchId));
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
