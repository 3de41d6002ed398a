import type { SharedPart } from '../../rules/facts.ts';
import type { LinkInput } from '../../rules/linkInput.ts';
import { LinkState } from '../../rules/linkState.ts';
import { divided, type PartWish } from '../shares.ts';
import { at, NONE } from './numbers.ts';
import type { Trial } from './trial.ts';

/** What one wort asks of a cake, as if it were the only one. */
export interface CakeWish extends PartWish {
  /** The whole cake, litres; null: not known. */
  wholeL: number | null;
}

/** @param input the link as if nobody else got of the cake */
export function wishOf(input: LinkInput): CakeWish {
  const { cake, recommended } = new LinkState(input);
  return {
    asked: input.pour.keepL ?? 'rest',
    recommendedL: recommended?.litres ?? null,
    wholeL: cake?.volumeL.likely ?? null,
  };
}

/** True of a cake that chains start from: it may go under several worts. Most cakes do not. */
export const startsChains = ({ roster }: Trial, cake: number): boolean =>
  cake !== NONE && (roster.branches[cake]?.length ?? 0) > 0;

/** As `takersOf` says it of a layout: who gets of a cake, in the order in which they are served. */
export function takersIn(trial: Trial, cake: number): number[] {
  if (trial.now.shelf[cake] === NONE) return [];
  const takers: number[] = [];
  trial.eachFollower(cake, (taker) => takers.push(taker));
  const { pencilled } = trial.roster;
  return takers.toSorted((a, b) => Number(pencilled[a]) - Number(pencilled[b]));
}

/** As `sharedWith` says it of a layout: what other worts get of the cake under a batch. */
export function sharedIn(
  trial: Trial,
  cake: number,
  batch: number,
  wishIn: (taker: number) => CakeWish | null,
): SharedPart[] {
  const takers = takersIn(trial, cake);
  if (takers.length < 2) return [];
  const wishes = takers.map((taker) => wishIn(taker) ?? NOT_KNOWN);
  const wholeL = wishes.find((wish) => wish.wholeL !== null)?.wholeL ?? null;
  const poured = takers.filter((taker) => !trial.roster.pencilled[taker]).length;
  const parts = divided(wholeL, wishes, poured);
  return takers.flatMap((taker, place) => {
    const litres = parts[place];
    const name = trial.roster.batches[taker]?.name ?? '';
    return taker !== batch && litres ? [{ name, litres }] : [];
  });
}

const NOT_KNOWN: CakeWish = { asked: 'rest', recommendedL: null, wholeL: null };

/** Tells who takes of the cakes that a batch stands on, on the board and in the trial. */
export function eachSharer(trial: Trial, batch: number, tell: (sharer: number) => void): void {
  const [was, is] = [at(trial.roster.standing.before, batch), at(trial.now.before, batch)];
  if (startsChains(trial, was)) trial.eachFollower(was, tell);
  if (is !== was && startsChains(trial, is)) trial.eachFollower(is, tell);
}
