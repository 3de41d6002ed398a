import type { Batch } from '../api/batch.ts';
import type { Interval } from '../rules/answer.ts';
import type { Day } from '../rules/vocabulary.ts';
import { isPencilled, indexBoard, type BoardFacts } from './board.ts';
import { costsAsMade } from './cost.ts';
import { judgeBoard, type JudgedBoard, type JudgedLink } from './judgeBoard.ts';
import { takersOf } from './takers.ts';

/** What of the cake under a batch lives, against what its wort needs; cells. */
export interface Alive {
  /** Living cells of what this wort may have: the cake without the parts of other worts. */
  cells: Interval;
  need: number;
  /** The same, as a multiple of the need. */
  ratio: Interval;
}

/** One batch of a chain with the figures that change along it. Null: not known. */
export interface CoursePoint {
  batchId: string;
  name: string;
  style: string;
  brewOn: Day | null;
  /** It is brewed; until then all of it is a plan. */
  isBrewed: boolean;
  generation: number | null;
  /** Original and final gravity, SG, each as read where it was. */
  og: number | null;
  fg: number | null;
  isOgRead: boolean;
  isFgRead: boolean;
  /** SRM and IBU with the retained beer in it; of a first batch its own. */
  srm: number | null;
  ibu: number | null;
  /** Null on a fresh start, where no cake is poured on. */
  alive: Alive | null;
  /** Kept part and whole cake under it, litres. */
  keptL: number | null;
  cakeL: number | null;
  /** Yeast per batch as of this one, minor units. */
  cost: number | null;
}

/** The link that leads to a batch. */
export interface CourseStep {
  laterId: string;
  earlierId: string;
  /** False: the cake comes from another chain. */
  isWithin: boolean;
  link: JudgedLink;
}

export interface Course {
  points: readonly CoursePoint[];
  steps: readonly CourseStep[];
}

/** Everything that climbs, falls or ages along a chain, batch by batch in its order. */
export function courseOf(
  board: BoardFacts,
  chainId: string,
  judged: JudgedBoard = judgeBoard(board),
): Course {
  const index = indexBoard(board);
  const costs = costsAsMade(index);
  const batches = index.batchesOf(chainId);
  const steps = batches.flatMap((later): CourseStep[] => {
    const earlier = index.predecessor(later.id);
    const link = judged.links.get(later.id);
    if (!earlier || !link) return [];
    const isWithin = earlier.chainId === chainId;
    return [{ laterId: later.id, earlierId: earlier.id, isWithin, link }];
  });
  const points = batches.map((batch) => ({
    ...ownFigures(batch),
    ...pouredFigures(batch, judged.links.get(batch.id)),
    generation: judged.generation.get(batch.id) ?? null,
    alive: aliveUnder(batch),
    cost: costs.get(batch.id) ?? null,
  }));
  return { points, steps };

  /** The parts of other worts are taken off first. */
  function aliveUnder(later: Batch): Alive | null {
    const link = judged.links.get(later.id);
    const source = index.predecessor(later.id);
    if (!link || !source) return null;
    const whole = link.cake.volumeL;
    const others = takersOf(index, source).flatMap(({ id }) =>
      id === later.id ? [] : (judged.links.get(id)?.keep.keptL ?? 0),
    );
    const taken = others.reduce((sum, litres) => sum + litres, 0);
    return aliveOf(link, whole ? Math.max(0, whole - taken) / whole : 1);
  }
}

function ownFigures(batch: Batch) {
  const { id, name, style, brewOn, read } = batch;
  return {
    batchId: id,
    name,
    style,
    brewOn,
    isBrewed: !isPencilled(batch),
    og: read.og ?? batch.og,
    fg: read.fg ?? batch.fg,
    isOgRead: read.og !== null,
    isFgRead: read.fg !== null,
  };
}

const pouredFigures = (batch: Batch, link: JudgedLink | undefined) => ({
  srm: link ? link.blend.srm : batch.srm,
  ibu: link ? link.blend.ibu : batch.ibu,
  keptL: link?.keep.keptL ?? null,
  cakeL: link?.cake.volumeL ?? null,
});

function aliveOf({ cake, need }: JudgedLink, share: number): Alive | null {
  const { viableCells } = cake;
  const needed = need.viableCells;
  if (viableCells === null || needed === null || needed === 0) return null;
  const cells = times(viableCells, share);
  return { cells, need: needed, ratio: times(cells, 1 / needed) };
}

const times = ({ low, likely, high }: Interval, by: number): Interval => ({
  low: low * by,
  likely: likely * by,
  high: high * by,
});
