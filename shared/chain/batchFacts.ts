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
  const facts: BatchFacts = { id: batch.id, name: batch.name, trub: batch.trub };
  // One after the other: a season's board asks for hundreds, and lists of keys are slow.
  const volumeL = read.volumeL ?? batch.volumeL;
  if (volumeL !== null) facts.volumeL = volumeL;
  const og = read.og ?? batch.og;
  if (og !== null) facts.og = og;
  const fg = read.fg ?? batch.fg;
  if (fg !== null) facts.fg = fg;
  if (batch.srm !== null) facts.srm = batch.srm;
  if (batch.ibu !== null) facts.ibu = batch.ibu;
  if (batch.fermentC !== null) facts.fermentC = batch.fermentC;
  const days = daysUnderBeer(batch);
  if (days !== null) facts.daysUnderBeer = days;
  if (batch.brewOn !== null) facts.brewOn = batch.brewOn;
  if (batch.dryHops !== null) facts.dryHops = batch.dryHops;
  if (batch.additions !== null) facts.additions = batch.additions;
  if (batch.allergens !== null) facts.allergens = batch.allergens;
  if (batch.cultures !== null) facts.cultures = batch.cultures;
  if (measuredCake !== null) facts.measuredCake = measuredCake;
  return facts;
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
