import type { Batch } from '../api/batch.ts';
import type { Vessel } from '../api/vessel.ts';
import type { Yeast } from '../api/yeast.ts';
import type {
  BatchFacts,
  MeasuredCake,
  PourFacts,
  VesselFacts,
  YeastFacts,
} from '../rules/facts.ts';
import { daysBetween } from '../units/day.ts';

type Nullable<T> = { [K in keyof T]: T[K] | null };
type Known<T> = { [K in keyof T]?: NonNullable<T[K]> };

/** Leaves out what is null: to the engine an absent key is unknown. */
function known<T extends object>(facts: Nullable<T>): Known<T> {
  const kept: Record<string, unknown> = {};
  for (const [key, value] of Object.entries(facts)) if (value !== null) kept[key] = value;
  return kept as Known<T>;
}

/**
 * A batch as the engine reads it. What was read stands in place of what was planned, never blended
 * with it; a null is undefined. L, SG, SRM, IBU, °C, days.
 */
export function factsOf(batch: Batch): BatchFacts {
  const { read, cake } = batch;
  // Every key, in one order: the rules read hundreds of these, and a reader of one shape is fast.
  return {
    id: batch.id,
    name: batch.name,
    volumeL: read.volumeL ?? batch.volumeL ?? undefined,
    og: read.og ?? batch.og ?? undefined,
    fg: read.fg ?? batch.fg ?? undefined,
    srm: batch.srm ?? undefined,
    ibu: batch.ibu ?? undefined,
    fermentC: batch.fermentC ?? undefined,
    daysUnderBeer: daysUnderBeer(batch) ?? undefined,
    brewOn: batch.brewOn ?? undefined,
    dryHops: batch.dryHops ?? undefined,
    additions: batch.additions ?? undefined,
    allergens: batch.allergens ?? undefined,
    cultures: batch.cultures ?? undefined,
    trub: batch.trub,
    measuredCake: cake?.measured ? measured(cake.measured) : undefined,
  };
}

/** Brew day to racking day where both were read, else as planned. */
const daysUnderBeer = ({ read, brewOn, daysUnderBeer: planned }: Batch): number | null =>
  read.rackedOn !== null && brewOn !== null ? daysBetween(brewOn, read.rackedOn) : planned;

function measured(cake: Nullable<MeasuredCake>): MeasuredCake | undefined {
  const facts = known<MeasuredCake>(cake);
  return Object.keys(facts).length > 0 ? facts : undefined;
}

/**
 * What a batch's own link says of the pour. On a board the recommended part is kept unless a part
 * is named or the whole cake is kept.
 */
export function pourFactsOf({ link }: Batch, earlier: Batch): PourFacts {
  const { read, brewOn } = earlier;
  // Without a brew day the engine cannot count to racking, but the day itself was read.
  const takenOn = link.takenOn ?? (brewOn === null ? read.rackedOn : null);
  return {
    takenOn: takenOn ?? undefined,
    keepL: link.keepWhole ? undefined : (link.keepL ?? 'recommended'),
    leftAboveL: link.leftAboveL ?? undefined,
    cakeC: link.cakeC ?? undefined,
    starter: link.starter,
    otherYeast: undefined,
    beersSinceCleaning: undefined,
    vessel: undefined,
    sharedWith: undefined,
  };
}

export const yeastFactsOf = (yeast: Yeast): YeastFacts => ({
  kind: yeast.kind,
  character: yeast.character,
  fermentMinC: yeast.fermentMinC ?? undefined,
  fermentMaxC: yeast.fermentMaxC ?? undefined,
  pourMinC: yeast.pourMinC ?? undefined,
  pourMaxC: yeast.pourMaxC ?? undefined,
  neverAboveC: yeast.neverAboveC ?? undefined,
  generationLimit: yeast.generationLimit ?? undefined,
});

export const vesselFactsOf = ({ capacityL, blowOff }: Vessel): VesselFacts => ({
  capacityL,
  blowOff,
});
