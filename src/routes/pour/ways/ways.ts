import type { Batch } from '#shared/api/batch.ts';
import type { ChainCreate } from '#shared/api/chain.ts';
import type { MoveRequest, ShiftedDate } from '#shared/api/move.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { indexBoard, isPencilled, type BoardFacts, type BoardIndex } from '#shared/chain/board.ts';
import { nextBrewDay, pullAlong, shiftedDates } from '#shared/chain/dates.ts';
import { draftOver } from '#shared/chain/draft.ts';
import { judgeBoard, type JudgedLink } from '#shared/chain/judgeBoard.ts';
import { moveBatch, withRows } from '#shared/chain/move.ts';
import { proposeShelf } from '#shared/chain/newShelf.ts';
import { addDays } from '#shared/units/day.ts';

/** What can be done where a cake is unfit, or not there. */
export interface Way {
  kind: 'fresh' | 'other-cake' | 'other-day';
  /** Of the other cake: its batch. */
  source: Batch | null;
  /** What the link says then; null: fresh yeast, there is no link. */
  link: JudgedLink | null;
  /** Minor units; 0: nothing to buy; null: not known. */
  cost: number | null;
  shifted: ShiftedDate[];
  /** Moves in this order, or the new days. */
  moves: Omit<MoveRequest, 'id'>[];
  days: { batchId: string; brewOn: string }[];
}

const MOST_CAKES = 3;
const RANK = { pour: 0, mind: 1, hold: 2 };

/** Fresh yeast, another bare cake, another day: each with its verdict and its cost. */
export function waysFor(board: BoardFacts, batch: Batch, ids: IdMaker, units: UnitPrefs): Way[] {
  const index = indexBoard(board);
  const cakeOf = index.predecessor(batch.id);
  const shelf = proposeShelf(index, batch.id, ids());
  const others = bareCakes(index, cakeOf?.id ?? null)
    .flatMap((source) => otherCake(index, batch, source, ids, units) ?? [])
    .sort((a, b) => RANK[a.link?.verdict ?? 'pour'] - RANK[b.link?.verdict ?? 'pour'])
    .slice(0, MOST_CAKES);
  const fresh = shelf && onNewShelf(index, batch, shelf, 'fresh', null, units);
  const later = otherDay(index, batch, units);
  return [...(fresh ? [fresh] : []), ...others, ...(later ? [later] : [])];
}
type IdMaker = () => string;

const bareCakes = (index: BoardIndex, except: string | null): Batch[] =>
  index.board.batches.filter(
    ({ id, stage, chainId, cake }) =>
      id !== except &&
      stage === 'racked' &&
      chainId !== null &&
      cake?.state === 'bare' &&
      cake.check?.judged !== 'unfit',
  );

function otherCake(
  index: BoardIndex,
  batch: Batch,
  source: Batch,
  ids: IdMaker,
  units: UnitPrefs,
): Way | null {
  const yeastId = index.chain(source.chainId ?? '')?.yeastId;
  const shelf = proposeShelf(index, batch.id, ids());
  if (!yeastId || !shelf) return null;
  const start = { kind: 'cake', batchId: source.id } as const;
  const name = `Cake of ${source.name}`.slice(0, 60);
  return onNewShelf(index, batch, { ...shelf, name, yeastId, start }, 'other-cake', source, units);
}

/** The batch, and the pencilled ones behind it, on a shelf of their own. */
function onNewShelf(
  index: BoardIndex,
  batch: Batch,
  newChain: ChainCreate,
  kind: Way['kind'],
  source: Batch | null,
  units: UnitPrefs,
): Way | null {
  const moves = movesOnto(index, batch, newChain);
  let board = index.board;
  for (const move of moves) {
    const done = moveBatch(board, move);
    if (!done.ok) return null;
    board = withRows(board, done.batches, done.chains);
  }
  return {
    kind,
    source,
    link: judgeBoard(board, units).links.get(batch.id) ?? null,
    cost: newChain.start.kind === 'pack' ? newChain.start.price : 0,
    shifted: shiftedDates(index, board.batches),
    moves,
    days: [],
  };
}

/** One move for the new shelf, then one after the other onto it. */
function movesOnto(index: BoardIndex, batch: Batch, newChain: ChainCreate): Way['moves'] {
  const from = batch.chainId;
  const mates = from === null ? [] : index.batchesOf(from);
  const behind = mates.slice(mates.findIndex(({ id }) => id === batch.id) + 1).filter(isPencilled);
  const rest = { expectedChainId: from, dates: 'pull' } as const;
  return [
    { ...rest, batchId: batch.id, toChainId: 'new', afterBatchId: null, newChain },
    ...behind.map(({ id }, place) => ({
      ...rest,
      batchId: id,
      toChainId: newChain.id,
      afterBatchId: (behind[place - 1] ?? batch).id,
    })),
  ];
}

/** The next free brew day after today, and the dates behind along with it. */
function otherDay(index: BoardIndex, batch: Batch, units: UnitPrefs): Way | null {
  const tomorrow = { ...index, board: { ...index.board, today: addDays(index.board.today, 1) } };
  const brewOn = nextBrewDay(tomorrow, batch.id);
  if (brewOn === null || brewOn === batch.brewOn || batch.chainId === null) return null;
  const draft = draftOver(index);
  draft.put({ ...batch, brewOn });
  const place = index.batchesOf(batch.chainId).findIndex(({ id }) => id === batch.id);
  pullAlong(index, draft, batch.chainId, place + 1, () => false);
  const rows = [...draft.rows.values()];
  const shifted = shiftedDates(index, rows);
  return {
    kind: 'other-day',
    source: null,
    link: judgeBoard(withRows(index.board, rows), units).links.get(batch.id) ?? null,
    cost: 0,
    shifted,
    moves: [],
    days: shifted.flatMap(({ batchId, to }) => (to === null ? [] : [{ batchId, brewOn: to }])),
  };
}
