import fc from 'fast-check';
import type { LinkInput } from '#shared/chain/checkLink.ts';
import type { BatchFacts, PourFacts, YeastFacts } from '#shared/rules/facts.ts';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { resolveHouseRules, type HouseRules } from '#shared/rules/resolve.ts';
import {
  ADDITION_KINDS,
  ALLERGENS,
  CULTURES,
  HOP_CONTAINMENTS,
  TIMINGS,
  TRUB_LEVELS,
  YEAST_KINDS,
} from '#shared/rules/vocabulary.ts';
import { addDays } from '#shared/units/day.ts';

/** Links as brewers might send them, odd ones and half-known ones among them. */

/** A number on a grid of `step`, so that limits are met exactly now and then. */
const grid = (min: number, max: number, step: number) =>
  fc
    .integer({ min: 0, max: Math.round((max - min) / step) })
    .map((n) => Number((min + n * step).toFixed(6)));

const day = fc.integer({ min: 0, max: 120 }).map((n) => addDays('2027-03-01', n));
const few = <T>(all: readonly T[]) => fc.subarray([...all], { maxLength: 2 });
const timed = fc.constantFrom(...TIMINGS);

const known: {
  [K in Exclude<keyof BatchFacts, 'id' | 'name' | 'measuredCake'>]-?: fc.Arbitrary<unknown>;
} = {
  volumeL: grid(5, 60, 0.5),
  og: grid(1.025, 1.13, 0.001),
  fg: grid(0.998, 1.024, 0.001),
  srm: grid(2, 50, 0.5),
  ibu: grid(0, 110, 1),
  fermentC: grid(4, 32, 0.5),
  daysUnderBeer: fc.integer({ min: 1, max: 130 }),
  brewOn: day,
  dryHops: fc.array(
    fc.record({
      gramsPerLitre: grid(0, 12, 0.25),
      contained: fc.constantFrom(...HOP_CONTAINMENTS),
      timing: timed,
    }),
    { maxLength: 2 },
  ),
  additions: fc.array(fc.record({ what: fc.constantFrom(...ADDITION_KINDS), timing: timed }), {
    maxLength: 2,
  }),
  allergens: few(ALLERGENS),
  cultures: few(CULTURES),
  trub: fc.constantFrom(...TRUB_LEVELS),
};

const withId = (facts: unknown): BatchFacts => ({ ...(facts as Omit<BatchFacts, 'id'>), id: 'x' });

/** A batch of which everything is known. */
export const wholeBatch: fc.Arbitrary<BatchFacts> = fc.record(known).map(withId);
/** A batch of which anything may be unknown. */
export const anyBatch: fc.Arbitrary<BatchFacts> = fc.oneof(
  wholeBatch,
  fc.record(known, { requiredKeys: [] }).map(withId),
);

export const anyYeast: fc.Arbitrary<YeastFacts> = fc.record(
  {
    kind: fc.constantFrom(...YEAST_KINDS),
    character: fc.boolean(),
    generationLimit: fc.integer({ min: 1, max: 12 }),
  },
  { requiredKeys: ['kind'] },
);

export const anyPour: fc.Arbitrary<PourFacts> = fc.record(
  {
    takenOn: day,
    keepL: fc.oneof(grid(0, 3, 0.05), fc.constant('recommended' as const)),
    leftAboveL: grid(0, 2, 0.1),
    cakeC: grid(0, 25, 0.5),
    starter: fc.boolean(),
    beersSinceCleaning: fc.integer({ min: 1, max: 6 }),
    otherYeast: fc.record({ kind: fc.constantFrom(...YEAST_KINDS), character: fc.boolean() }),
  },
  { requiredKeys: [] },
);

const KEYS = Object.keys(HOUSE_RULES) as HouseRuleKey[];

/** A few changed house rules that would be let through. */
export const anyHouseRules: fc.Arbitrary<HouseRules> = fc
  .array(fc.tuple(fc.constantFrom(...KEYS), fc.integer({ min: 0, max: 40 })), { maxLength: 3 })
  .map((changes) =>
    resolveHouseRules(
      Object.fromEntries(
        changes.map(([key, n]) => {
          const { min, max } = HOUSE_RULES[key];
          return [key, min + ((max - min) * n) / 40];
        }),
      ),
    ),
  )
  .filter((resolved) => resolved.ok)
  .map((resolved) => resolved.rules);

const linkOf = (batch: fc.Arbitrary<BatchFacts>): fc.Arbitrary<LinkInput> =>
  fc.record({
    earlier: batch,
    later: batch,
    pour: anyPour,
    yeast: anyYeast,
    vessel: fc.record({ capacityL: grid(8, 80, 0.5), blowOff: fc.boolean() }, { requiredKeys: [] }),
    generation: fc.option(fc.integer({ min: 2, max: 14 }), { nil: undefined }),
    inherited: fc.record({ allergens: few(ALLERGENS), cultures: few(CULTURES) }),
    rules: fc.oneof(fc.constant(usual()), anyHouseRules),
  });

function usual(): HouseRules {
  const resolved = resolveHouseRules({});
  if (!resolved.ok) throw new Error('the defaults are refused');
  return resolved.rules;
}

export const anyLink = linkOf(anyBatch);
export const wholeLink = linkOf(wholeBatch);
