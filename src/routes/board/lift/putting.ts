import type { Moved, MoveRequest } from '#shared/api/move.ts';
import { moveBatch } from '#shared/chain/move.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import { failureWords, OFFLINE_WORDS, refusalWords } from './failure.ts';
import type { Change } from './liftState.ts';
import type { LiftStore } from './liftStore.ts';
import { isOpen } from './places.ts';
import type { LiftPorts } from './ports.ts';
import { batchName, droppedWords, keptDatesWords, putBackWords } from './words.ts';
import { wishOf } from './wish.ts';

export interface Putting {
  /** Puts a batch into a place; asks for the yeast of a new shelf where the batch names none. */
  put(batchId: string, gap: Gap, how?: How): void;
  /** Works out what the same will show. The answer puts it: in a frame of its own, it is drawn sooner. */
  ready(batchId: string, gap: Gap, how?: How): () => void;
  /** No yeast for a new shelf: the batch stays where it was. */
  giveUp(): void;
  /** The same drop once more, with every date as it was before it. */
  keepDates(): void;
  undo(): void;
  redo(): void;
}

export interface How {
  /** Of a new shelf. */
  yeastId?: string;
  /** Where it was when it was lifted: moved by somebody since, it stays where they put it. */
  from?: string | null;
}

interface Scene {
  store: LiftStore;
  ports: LiftPorts;
}

function refuse({ store, ports }: Scene, words: string) {
  store.set({ refusal: words, change: null });
  ports.say(words);
}

function changeOf(
  request: MoveRequest,
  gap: Gap,
  done: Pick<Moved, 'shifted' | 'cleared'>,
): Change {
  const { shifted, cleared } = done;
  return { request, gap, status: 'saving', what: '', shifted, cleared, changeId: null };
}

/** Shows the drop at once, sends it, and tells what became of it. */
function send(scene: Scene, request: MoveRequest, gap: Gap, again: boolean) {
  const { store, ports } = scene;
  const board = ports.board();
  const name = batchName(board, request.batchId);
  const preview = again ? null : moveBatch(board, request);
  if (preview && !preview.ok) return refuse(scene, refusalWords(preview.why, preview.detail));
  const change = changeOf(request, gap, preview ?? { shifted: [], cleared: [] });
  store.set({ change, refusal: null });
  const answer = again ? ports.moveAgain(request) : ports.move(request);
  // A gap is judged with its dates pulled along: of kept ones the panel tells, from the new board.
  ports.say(
    again
      ? keptDatesWords(ports.board(), request.batchId)
      : droppedWords(ports.board(), request.batchId, gap, change.shifted.length),
  );
  ports.focusBatch(request.batchId);
  answer.then(
    ({ what, shifted, cleared, changeId }) => {
      if (store.get().change?.request.id !== request.id) return;
      store.set({ change: { ...change, status: 'saved', what, shifted, cleared, changeId } });
    },
    (error: unknown) => refuse(scene, failureWords(error, name)),
  );
}

function ready(scene: Scene, batchId: string, gap: Gap, how: How = {}): () => void {
  const { store, ports } = scene;
  const board = ports.board();
  const batch = board.batches.find((row) => row.id === batchId);
  if (!batch || !isOpen(gap)) return () => {};
  if (!ports.isOnline()) return () => refuse(scene, OFFLINE_WORDS);
  const { yeastId = null, from = batch.chainId } = how;
  const request = wishOf(board, { batch, gap, from, dates: 'pull', yeastId }, ports.newId);
  if (!request) return () => store.set({ yeastFor: { batchId, gap, from } });
  ports.foresee(request);
  return () => {
    store.set({ yeastFor: null, placesFor: null });
    send(scene, request, gap, false);
  };
}

function giveUp({ store, ports }: Scene) {
  const { yeastFor } = store.get();
  if (!yeastFor) return;
  store.set({ yeastFor: null });
  ports.say(putBackWords(ports.board(), yeastFor.batchId));
  ports.focusBatch(yeastFor.batchId);
}

function keepDates(scene: Scene) {
  const { change } = scene.store.get();
  if (change?.status !== 'saved') return;
  const { request, gap } = change;
  const newChain = request.newChain && { ...request.newChain, id: scene.ports.newId() };
  const again = { ...request, id: scene.ports.newId(), dates: 'keep' as const };
  send(scene, newChain ? { ...again, newChain } : again, gap, true);
}

function turnBack(scene: Scene, which: 'undo' | 'redo') {
  const { store, ports } = scene;
  const batchId = store.get().change?.request.batchId;
  const said = ports.board()[which]?.what;
  if (!ports.isOnline()) return refuse(scene, OFFLINE_WORDS);
  ports[which]().then(
    () => {
      store.set({ change: null, refusal: null });
      ports.say(`${which === 'undo' ? 'Undone' : 'Done again'}: ${said ?? 'the last change'}.`);
      if (batchId) ports.focusBatch(batchId);
    },
    (error: unknown) => refuse(scene, failureWords(error, null)),
  );
}

export function createPutting(store: LiftStore, ports: LiftPorts): Putting {
  const scene = { store, ports };
  return {
    put: (batchId, gap, how) => ready(scene, batchId, gap, how)(),
    ready: (batchId, gap, how) => ready(scene, batchId, gap, how),
    giveUp: () => giveUp(scene),
    keepDates: () => keepDates(scene),
    undo: () => turnBack(scene, 'undo'),
    redo: () => turnBack(scene, 'redo'),
  };
}
