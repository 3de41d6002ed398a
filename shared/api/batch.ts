import { z } from 'zod';
import {
  ADDITION_KINDS,
  ALLERGENS,
  CULTURES,
  HOP_CONTAINMENTS,
  RULE_IDS,
  TIMINGS,
  TRUB_LEVELS,
} from '../rules/vocabulary.ts';
import { JUDGEMENTS } from './cakeCheck.ts';
import * as f from './fields.ts';
import { typed } from './units.ts';

export const STAGES = ['pencilled', 'fermenting', 'racked', 'scrapped'] as const;
export const stage = z.enum(STAGES);
export type Stage = z.infer<typeof stage>;

export const CAKE_STATES = ['growing', 'bare', 'poured', 'jarred', 'dumped'] as const;
export type CakeState = (typeof CAKE_STATES)[number];

export const dryHop = z.strictObject({
  gramsPerLitre: f.gramsPerLitre,
  contained: z.enum(HOP_CONTAINMENTS),
  timing: z.enum(TIMINGS),
});
export const addition = z.strictObject({
  what: z.enum(ADDITION_KINDS),
  timing: z.enum(TIMINGS),
});

/** What is planned. A null is unknown. */
const facts = {
  name: f.name,
  /** A name of the style list or the brewer's own words. */
  style: z.string().trim().max(60),
  volumeL: f.volumeL.nullable(),
  og: f.originalGravity.nullable(),
  fg: f.finalGravity.nullable(),
  srm: f.srm.nullable(),
  ibu: f.ibu.nullable(),
  fermentC: f.celsius.nullable(),
  daysUnderBeer: f.days.nullable(),
  brewOn: f.day.nullable(),
  /** When the beer is wanted. */
  wantedOn: f.day.nullable(),
  /** Empty: none. Null: unknown. */
  dryHops: z.array(dryHop).max(12).nullable(),
  additions: z.array(addition).max(20).nullable(),
  allergens: z.array(z.enum(ALLERGENS)).max(14).nullable(),
  cultures: z.array(z.enum(CULTURES)).max(5).nullable(),
  trub: z.enum(TRUB_LEVELS),
  /** Null: the chain's. */
  vesselId: f.id.nullable(),
  /** The yeast this beer asks for; null: whatever the chain has. */
  yeastId: f.id.nullable(),
  notes: f.note,
  typed,
};

/** Facts of the link from the batch before; they belong to the link and go when it is broken. */
const linkFacts = {
  /** Day the yeast was taken from the batch before; null: at racking. */
  takenOn: f.day.nullable(),
  /** Kept part of the cake, litres; null: the recommended part. */
  keepL: f.partL.nullable(),
  /** Keep all of it; then `keepL` is null. */
  keepWhole: z.boolean(),
  leftAboveL: f.partL.nullable(),
  /** Temperature at which the cake waits. */
  cakeC: f.celsius.nullable(),
  starter: z.boolean(),
  typed,
};

export const acceptance = z.strictObject({
  reason: z.string(),
  rules: z.array(z.enum(RULE_IDS)),
  by: f.name,
  at: z.iso.datetime(),
});
export type Acceptance = z.infer<typeof acceptance>;

export const link = z.strictObject({ ...linkFacts, acceptance: acceptance.nullable() });
export type Link = z.infer<typeof link>;

/** What was read, in place of the plan. A null was not read. */
export const readFacts = z.strictObject({
  volumeL: f.volumeL.nullable(),
  og: f.originalGravity.nullable(),
  fg: f.finalGravity.nullable(),
  rackedOn: f.day.nullable(),
});
export type ReadFacts = z.infer<typeof readFacts>;

/** What the readings of a batch come to; renewed with each. SG, °C. */
export const followed = z.strictObject({
  /** How many readings there are, of any kind. */
  count: z.number().int(),
  lastAt: z.iso.datetime(),
  /** When the wort was poured onto its yeast; null: no pour was recorded. */
  pouredAt: z.iso.datetime().nullable(),
  firstGravity: z.number().nullable(),
  firstGravityAt: z.iso.datetime().nullable(),
  /** The newest gravity; null: none was read. */
  gravity: z.number().nullable(),
  gravityAt: z.iso.datetime().nullable(),
  /** From when on no gravity was further than 0.001 from the newest. */
  steadyFrom: z.iso.datetime().nullable(),
  lowest: z.number().nullable(),
  /** The first gravity that stood clearly below the first one read: it had begun. */
  begunAt: z.iso.datetime().nullable(),
  /** The last gravity before that: it had not begun. */
  stillAt: z.iso.datetime().nullable(),
  temperatureC: z.number().nullable(),
  temperatureAt: z.iso.datetime().nullable(),
});
export type Followed = z.infer<typeof followed>;

export const cake = z.strictObject({
  state: z.enum(CAKE_STATES),
  /** How it was judged at racking; null: nobody has. */
  check: z
    .strictObject({ judged: z.enum(JUDGEMENTS), tasted: z.enum(['clean', 'off']) })
    .nullable(),
  measured: z
    .strictObject({
      volumeL: z.number().nullable(),
      massKg: z.number().nullable(),
      viability: z.number().nullable(),
      cellsPerMl: z.number().nullable(),
    })
    .nullable(),
});
export type Cake = z.infer<typeof cake>;

export const batch = z.strictObject({
  id: f.id,
  version: f.version,
  ...facts,
  /** Null: on the bench. */
  chainId: f.id.nullable(),
  /** Place in its chain or on the bench, from 0. */
  place: z.number().int().min(0),
  stage,
  /** What went wrong, of a scrapped batch; else empty. */
  scrapReason: f.note,
  read: readFacts,
  /** Null: no reading was taken. */
  followed: followed.nullable(),
  /** Null while pencilled. */
  cake: cake.nullable(),
  link,
});
export type Batch = z.infer<typeof batch>;

const gravitiesFit = (
  value: { og?: number | null; fg?: number | null },
  ctx: z.core.$RefinementCtx<unknown>,
) => {
  if (typeof value.og === 'number' && typeof value.fg === 'number' && value.fg > value.og)
    ctx.addIssue({
      code: 'custom',
      path: ['fg'],
      message: 'The final gravity cannot be above the original',
    });
};

export const batchCreate = z.strictObject({ id: f.id, ...facts }).superRefine(gravitiesFit);
export type BatchCreate = z.infer<typeof batchCreate>;
export const batchPatch = z.strictObject(facts).partial().superRefine(gravitiesFit);
export type BatchPatch = z.infer<typeof batchPatch>;

export const linkPatch = z.strictObject(linkFacts).partial();
export type LinkPatch = z.infer<typeof linkPatch>;

/** A stage change asks for what was read. */
export const stageRequest = z.discriminatedUnion('stage', [
  z.strictObject({ stage: z.literal('pencilled') }),
  z.strictObject({
    stage: z.literal('fermenting'),
    brewedOn: f.day,
    volumeL: f.volumeL.nullable(),
    og: f.originalGravity.nullable(),
  }),
  z.strictObject({
    stage: z.literal('racked'),
    rackedOn: f.day,
    volumeL: f.volumeL.nullable(),
    fg: f.finalGravity.nullable(),
  }),
  z.strictObject({ stage: z.literal('scrapped'), reason: f.note }),
]);
export type StageRequest = z.infer<typeof stageRequest>;

export const acceptanceRequest = z.strictObject({
  reason: f.note.min(3, 'Write why, in a few words'),
});
