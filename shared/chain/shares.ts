import type { Batch } from '../api/batch.ts';
import { LinkState } from '../rules/linkState.ts';
import type { SharedPart } from '../rules/facts.ts';
import { isPencilled, type BoardFacts } from './board.ts';
import { sightOf, unsharedLink, type Sight } from './boardLink.ts';
import { takersOf } from './takers.ts';

/** A part of a cake: litres, the recommended part of that wort, or all that others leave. */
export type AskedPart = number | 'recommended' | 'rest';

/** One wort that a cake goes under, with its part. */
export interface CakeTaker {
  batchId: string;
  chainId: string | null;
  name: string;
  asked: AskedPart;
  /** What it gets, litres; null: not known. */
  litres: number | null;
  /** It asks for more than others leave. */
  isShort: boolean;
}

export interface CakeShares {
  batchId: string;
  /** The whole cake as estimated or measured, litres; null: not known. */
  wholeL: number | null;
  /** In the order in which they are served: brewed ones, the batch's own chain, its branches. */
  takers: readonly CakeTaker[];
  /** What nobody takes, litres; null: not known. */
  leftL: number | null;
}

/** How the cake of a batch is divided among the worts that it goes under. */
export function sharesOf(board: BoardFacts, batchId: string): CakeShares {
  const sight = sightOf(board);
  const source = sight.layout.batch(batchId);
  return source ? sharesIn(sight, source) : { batchId, wholeL: null, takers: [], leftL: null };
}

export function sharesIn(sight: Sight, source: Batch): CakeShares {
  const takers = takersOf(sight.layout, source);
  const links = takers.map((taker) => {
    const input = unsharedLink(source, taker, sight);
    return input ? new LinkState(input) : null;
  });
  const wholeL = links.find((link) => link?.cake)?.cake?.volumeL.likely ?? null;
  const wishes = takers.map((taker, at) => ({
    asked: askedOf(taker),
    recommendedL: links[at]?.recommended?.litres ?? null,
  }));
  const poured = takers.filter((taker) => !isPencilled(taker)).length;
  const parts = divided(wholeL, wishes, poured);
  return {
    batchId: source.id,
    wholeL,
    leftL: wholeL === null ? null : Math.max(0, wholeL - sumOf(parts)),
    takers: takers.map((taker, at) => {
      const { asked, recommendedL } = wishes[at] ?? { asked: 'rest', recommendedL: null };
      const litres = parts[at] ?? null;
      const wanted = asked === 'rest' ? null : asked === 'recommended' ? recommendedL : asked;
      return {
        batchId: taker.id,
        chainId: taker.chainId,
        name: taker.name,
        asked,
        litres,
        isShort: litres !== null && wanted !== null && wanted > litres + READING_L,
      };
    }),
  };
}

/**
 * The part of each wort, litres, of which the first `poured` have theirs: what was poured is gone,
 * whoever asks for how much of the rest. Null: not known, as of a cake whose size is not.
 */
export function divided(
  wholeL: number | null,
  wishes: readonly PartWish[],
  poured: number,
): (number | null)[] {
  if (wholeL === null) return wishes.map(() => null);
  const gone = allot(wholeL, wishes.slice(0, poured));
  return [...gone, ...allot(wholeL - sumOf(gone), wishes.slice(poured))];
}

const sumOf = (parts: readonly (number | null)[]): number =>
  parts.reduce<number>((sum, litres) => sum + (litres ?? 0), 0);

const askedOf = ({ link }: Batch): AskedPart =>
  link.keepWhole ? 'rest' : (link.keepL ?? 'recommended');

/** Less than a reading of a cake's height shows, litres. */
const READING_L = 0.005;

export interface PartWish {
  asked: AskedPart;
  /** What this wort would need, litres; null: not known. */
  recommendedL: number | null;
}

/**
 * Divides a cake, litres: parts that were named first, then recommended ones, then whoever takes
 * the rest; within each in the given order, each at most what is left. Null: not known.
 */
export function allot(wholeL: number, wishes: readonly PartWish[]): (number | null)[] {
  const parts = wishes.map((): number | null => null);
  let left = Math.max(0, wholeL);
  const serve = (isTurn: (asked: AskedPart) => boolean, want: (wish: PartWish) => number | null) =>
    wishes.forEach((wish, at) => {
      const wanted = isTurn(wish.asked) ? want(wish) : null;
      if (wanted === null) return;
      const part = Math.min(Math.max(0, wanted), left);
      parts[at] = part;
      left = Math.max(0, left - part);
    });
  serve(
    (asked) => typeof asked === 'number',
    ({ asked }) => Number(asked),
  );
  serve(
    (asked) => asked === 'recommended',
    ({ recommendedL }) => recommendedL,
  );
  serve(
    (asked) => asked === 'rest',
    () => left,
  );
  return parts;
}

/** What other worts get of the cake under a batch; empty where it goes under this one alone. */
export function sharedWith(source: Batch, laterId: string, sight: Sight): SharedPart[] {
  if (sight.layout.branchesOf(source.id).length === 0) return [];
  return sharesIn(sight, source).takers.flatMap(({ batchId, name, litres }) =>
    batchId !== laterId && litres ? [{ name, litres }] : [],
  );
}

/** A part that does not fit beside the parts which others were promised. */
export interface Overstep {
  wholeL: number;
  /** Other takers, with what is bound: named in litres, or poured already. */
  others: readonly SharedPart[];
  /** What is left for this one, litres. */
  leftL: number;
}

/** Why `keepL` litres cannot be kept for a batch; null where they fit, or nobody shares the cake. */
export function overstepOf(board: BoardFacts, laterId: string, keepL: number): Overstep | null {
  const sight = sightOf(board);
  const source = sight.layout.predecessor(laterId);
  if (!source) return null;
  const { wholeL, takers } = sharesIn(sight, source);
  const others = takers.filter(({ batchId }) => batchId !== laterId);
  if (wholeL === null || others.length === 0) return null;
  const bound = others.map(({ batchId, name, asked, litres }) => {
    const isPoured = sight.layout.batch(batchId)?.stage !== 'pencilled';
    return { name, litres: typeof asked === 'number' ? asked : isPoured ? (litres ?? 0) : 0 };
  });
  const leftL = Math.max(0, wholeL - bound.reduce((sum, { litres }) => sum + litres, 0));
  return keepL > leftL + READING_L ? { wholeL, others: bound, leftL } : null;
}
