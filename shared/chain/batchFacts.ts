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
 * with it; a null is left out. L, SG, SRM, IBU, °C, days.
 */
export function factsOf(batch: Batch): BatchFacts {
  const { read, cake } = batch;
  const measuredCake = cake?.measured ? measured(cake.measured) : null;
  return {
    id: batch.id,
    name: batch.name,
    trub: batch.trub,
    ...known({
      volumeL: read.volumeL ?? batch.volumeL,
      og: read.og ?? batch.og,
      fg: read.fg ?? batch.fg,
      srm: batch.srm,
      ibu: batch.ibu,
      fermentC: batch.fermentC,
      daysUnderBeer: daysUnderBeer(batch),
      brewOn: batch.brewOn,
      dryHops: batch.dryHops,
      additions: batch.additions,
      allergens: batch.allergens,
      cultures: batch.cultures,
      measuredCake,
    }),
  };
}

/** Brew day to racking day where both were read, else as planned. */
const daysUnderBeer = ({ read, brewOn, daysUnderBeer: planned }: Batch): number | null =>
  read.rackedOn !== null && brewOn !== null ? daysBetween(brewOn, read.rackedOn) : planned;

function measured(cake: Nullable<MeasuredCake>): MeasuredCake | null {
  const facts = known<MeasuredCake>(cake);
  return Object.keys(facts).length > 0 ? facts : null;
}

/**
 * What a batch's own link says of the pour. On a board the recommended part is kept unless a part
 * is named or the whole cake is kept.
 */
export function pourFactsOf({ link }: Batch, earlier: Batch): PourFacts {
  const { read, brewOn } = earlier;
  // Without a brew day the engine cannot count to racking, but the day itself was read.
  const takenOn = link.takenOn ?? (brewOn === null ? read.rackedOn : null);
  const pour: PourFacts = { starter: link.starter };
  if (takenOn !== null) pour.takenOn = takenOn;
  if (!link.keepWhole) pour.keepL = link.keepL ?? 'recommended';
  if (link.leftAboveL !== null) pour.leftAboveL = link.leftAboveL;
  if (link.cakeC !== null) pour.cakeC = link.cakeC;
  return pour;
}

export function yeastFactsOf(yeast: Yeast): YeastFacts {
  const { kind, character, fermentMinC, fermentMaxC, pourMinC, pourMaxC } = yeast;
  const { neverAboveC, generationLimit } = yeast;
  const limits = { fermentMinC, fermentMaxC, pourMinC, pourMaxC, neverAboveC, generationLimit };
  return { kind, character, ...known(limits) };
}

export const vesselFactsOf = ({ capacityL, blowOff }: Vessel): VesselFacts => ({
  capacityL,
  blowOff,
});
