import type { CheckedBatch, CheckedLink, CheckChainRequest } from '../api/check.ts';
import type { Interval, LinkAnswer } from '../rules/answer.ts';
import type { BatchFacts, PourFacts, VesselFacts, YeastFacts } from '../rules/facts.ts';

/** Between the check's request and answer and the engine's own types. */

/** The same object without its nulls: absent is unknown in the engine. */
type Known<T> = { [K in keyof T]: Exclude<T[K], null> };
function known<T extends object>(from: T): Known<T> {
  const kept = Object.entries(from).filter(([, value]) => value !== null && value !== undefined);
  return Object.fromEntries(kept) as Known<T>;
}

export const yeastFrom = (yeast: CheckChainRequest['yeast']): YeastFacts => known(yeast);

export const vesselFrom = (
  vessel: NonNullable<CheckChainRequest['vessel']> | null | undefined,
): VesselFacts | undefined => (vessel === null || vessel === undefined ? undefined : known(vessel));

export function batchFrom(batch: CheckedBatch): BatchFacts {
  const { id, name, volumeL, og, fg, srm, ibu, fermentC, daysUnderBeer, brewOn } = batch;
  const { additions, allergens, cultures, trub, dryHop } = batch;
  const numbers = { volumeL, og, fg, srm, ibu, fermentC, daysUnderBeer };
  const rest = { id, name, brewOn, additions, allergens, cultures, trub };
  const dryHops =
    dryHop === undefined
      ? undefined
      : dryHop === null
        ? []
        : Array.isArray(dryHop)
          ? dryHop
          : [dryHop];
  return known({ ...rest, ...numbers, dryHops });
}

/** @param batch the later batch of the link */
export function pourFrom(batch: CheckedBatch): PourFacts {
  const { takenOn, keepL, leftAboveL, cakeC, starter, beersSinceCleaning } = batch;
  const otherYeast = batch.otherYeast ? known(batch.otherYeast) : undefined;
  const vessel = vesselFrom(batch.vessel);
  return known({
    takenOn,
    keepL,
    leftAboveL,
    cakeC,
    starter,
    beersSinceCleaning,
    otherYeast,
    vessel,
  });
}

const digits = (value: number | null, places: number): number | null =>
  value === null ? null : Number(value.toFixed(places));
/** Cells are known to a factor; three digits are enough. */
const cells = (value: number): number => Number(value.toPrecision(3));
const interval = ({ low, likely, high }: Interval): Interval => ({
  low: cells(low),
  likely: cells(likely),
  high: cells(high),
});

/** The engine's answer with the keys of the contract and rounded figures. */
export function linkToWire(answer: LinkAnswer): CheckedLink {
  const { blend, cake, need, keep, ...rest } = answer;
  return {
    ...rest,
    blend: {
      og: digits(blend.og, 4),
      srm: digits(blend.srm, 2),
      ibu: digits(blend.ibu, 2),
      deltaE00: digits(blend.deltaE00, 2),
    },
    cake: {
      viableCells: cake.viableCells === null ? null : interval(cake.viableCells),
      volumeL: digits(cake.volumeL, 3),
      massKg: digits(cake.massKg, 3),
    },
    need: { viableCells: need.viableCells === null ? null : cells(need.viableCells) },
    keep: {
      keptL: digits(keep.keptL, 3),
      ratio: digits(keep.ratio, 2),
      recommendedL: digits(keep.recommendedL, 3),
      recommendedKg: digits(keep.recommendedKg, 3),
    },
  };
}
