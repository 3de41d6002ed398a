import { z } from 'zod';
import { LIMIT_PAIRS, limitIssue, softenedIssue } from '../rules/resolve.ts';
import {
  ALLERGENS,
  CULTURES,
  RULE_IDS,
  TRUB_LEVELS,
  VERDICTS,
  YEAST_KINDS,
} from '../rules/vocabulary.ts';
import { addition, dryHop } from './batch.ts';
import { houseRuleChanges, type HouseRuleChanges } from './board.ts';
import * as f from './fields.ts';
import { alsoWhenFaulty, bothEnds } from './refining.ts';

/** `POST /api/check/chain`. A key that is absent is unknown, and so is a null unless said here. */

export const maybe = <T extends z.ZodType>(schema: T) => schema.nullable().optional();

const yeast = [
  ['fermentMinC', 'fermentMaxC'],
  ['pourMinC', 'pourMaxC'],
].reduce(
  (schema, [min = '', max = '']) => bothEnds(schema, min, max),
  z.strictObject({
    kind: z.enum(YEAST_KINDS),
    character: maybe(z.boolean()),
    fermentMinC: maybe(f.celsius),
    fermentMaxC: maybe(f.celsius),
    pourMinC: maybe(f.celsius),
    pourMaxC: maybe(f.celsius),
    neverAboveC: maybe(f.celsius),
    generationLimit: maybe(z.number().int().min(1).max(30)),
  }),
);

const vessel = z.strictObject({ capacityL: maybe(f.volumeL), blowOff: maybe(z.boolean()) });

/** Keys that speak of the link from the batch before; the first batch has none. */
const linkFacts = {
  /** Null: at racking. */
  takenOn: maybe(f.day),
  /** Litres of cake; null: all of it. */
  keepL: maybe(f.partL),
  leftAboveL: maybe(f.partL),
  cakeC: maybe(f.celsius),
  starter: maybe(z.boolean()),
  /** Null: the chain's yeast. */
  otherYeast: maybe(z.strictObject({ kind: z.enum(YEAST_KINDS), character: maybe(z.boolean()) })),
  /** Null: not recorded. */
  beersSinceCleaning: maybe(z.number().int().min(1).max(1000)),
};
export const LINK_KEYS = Object.keys(linkFacts) as (keyof typeof linkFacts)[];

const batch = alsoWhenFaulty(
  z.strictObject({
    id: z.string().min(1, 'Give it an id').max(100, 'Use at most 100 characters'),
    name: maybe(f.name),
    volumeL: maybe(f.volumeL),
    og: maybe(f.originalGravity),
    fg: maybe(f.finalGravity),
    srm: maybe(f.srm),
    ibu: maybe(f.ibu),
    fermentC: maybe(f.celsius),
    daysUnderBeer: maybe(f.days),
    brewOn: maybe(f.day),
    /** Null: none. */
    dryHop: maybe(z.union([dryHop, z.array(dryHop).max(12)])),
    additions: maybe(z.array(addition).max(20)),
    allergens: maybe(z.array(z.enum(ALLERGENS)).max(14)),
    cultures: maybe(z.array(z.enum(CULTURES)).max(5)),
    trub: maybe(z.enum(TRUB_LEVELS)),
    /** Null: the chain's. */
    vessel: maybe(vessel),
    ...linkFacts,
  }),
  ['fg'],
  'Between 0.985 and the original gravity',
  ({ og, fg }) => typeof og !== 'number' || typeof fg !== 'number' || fg <= og,
);
export type CheckedBatch = z.infer<typeof batch>;

/** A brewery's changes, with the order of their limits. */
export function orderedHouseRules() {
  let schema: z.ZodType<HouseRuleChanges> = houseRuleChanges;
  for (const pair of LIMIT_PAIRS)
    for (const key of [pair.mind, pair.hold])
      schema = alsoWhenFaulty(
        schema,
        [key],
        `A mind limit cannot be looser than its hold limit: ${pair.mind}, ${pair.hold}`,
        (changes) => limitIssue(pair, changes)?.key !== key,
      );
  return alsoWhenFaulty(
    schema,
    ['softened'],
    'An allergen or a wild culture cannot be softened',
    ({ softened }) => !Array.isArray(softened) || softenedIssue(softened) === null,
  );
}

/** Most batches of one chain that are checked at once. */
const MOST_BATCHES = 200;

function firstBatchRefined<T extends z.ZodType<{ batches: CheckedBatch[] }>>(schema: T): T {
  let refined = schema;
  for (const key of LINK_KEYS)
    refined = alsoWhenFaulty(
      refined,
      ['batches', 0, key],
      'The first batch has no batch before it: leave this out',
      ({ batches }) => !Array.isArray(batches) || (batches[0]?.[key] ?? null) === null,
    );
  return refined;
}

export const checkChainRequest = alsoWhenFaulty(
  firstBatchRefined(
    z.strictObject({
      yeast,
      /** Null: unknown. */
      vessel: maybe(vessel),
      firstGeneration: maybe(z.number().int().min(1).max(60)),
      /** Highest original gravity of beers on this yeast before the first batch. */
      strongestEarlierOg: maybe(f.originalGravity),
      houseRules: maybe(orderedHouseRules()),
      batches: z
        .array(batch)
        .min(1, 'Give at least one batch')
        .max(MOST_BATCHES, `At most ${MOST_BATCHES} batches`),
    }),
  ),
  ['batches'],
  'Give each batch an id of its own',
  ({ batches }) =>
    !Array.isArray(batches) || new Set(batches.map((one) => one?.id)).size === batches.length,
);
export type CheckChainRequest = z.infer<typeof checkChainRequest>;

const figure = z.number().nullable();
const verdict = z.enum(VERDICTS);

export const finding = z.strictObject({
  rule: z.enum(RULE_IDS),
  verdict: z.enum(['mind', 'hold']),
  title: z.string(),
  because: z.string(),
  do: z.string(),
  measures: z.array(
    z.strictObject({
      label: z.string(),
      value: z.number(),
      unit: z.string(),
      limit: z.number().nullable(),
    }),
  ),
  basis: z.string(),
});

export const checkedLink = z.strictObject({
  from: z.string(),
  to: z.string(),
  verdict,
  generation: figure,
  takenOn: f.day.nullable(),
  waitDays: figure,
  findings: z.array(finding),
  passed: z.array(z.enum(RULE_IDS)),
  unchecked: z.array(z.strictObject({ rule: z.enum(RULE_IDS), missing: z.array(z.string()) })),
  advice: z.array(z.strictObject({ id: z.string(), text: z.string() })),
  blend: z.strictObject({ og: figure, srm: figure, ibu: figure, deltaE00: figure }),
  cake: z.strictObject({
    /** low and high bound the 90 % interval. */
    viableCells: z
      .strictObject({ low: z.number(), likely: z.number(), high: z.number() })
      .nullable(),
    volumeL: figure,
    massKg: figure,
  }),
  need: z.strictObject({ viableCells: figure }),
  keep: z.strictObject({
    keptL: figure,
    ratio: figure,
    recommendedL: figure,
    recommendedKg: figure,
  }),
});
export type CheckedLink = z.infer<typeof checkedLink>;

export const checkChainAnswer = z.strictObject({
  verdict,
  chain: z.strictObject({
    counts: z.strictObject({
      pour: z.number().int(),
      mind: z.number().int(),
      hold: z.number().int(),
    }),
    rackOn: z.array(f.day.nullable()),
    generations: z.array(z.number().int().nullable()),
  }),
  links: z.array(checkedLink),
});
export type CheckChainAnswer = z.infer<typeof checkChainAnswer>;
