import { z } from 'zod';
import { ALLERGENS, CULTURES } from '../rules/vocabulary.ts';
import { batch } from './batch.ts';
import { houseRuleChanges } from './board.ts';
import { chain } from './chain.ts';
import * as f from './fields.ts';
import { unitPrefs } from './units.ts';
import { vessel } from './vessel.ts';
import { yeast } from './yeast.ts';

/** A read-only look at one chain, as those who keep it see it listed. */
export const shareLink = z.strictObject({
  id: f.id,
  version: f.version,
  /** Whom or what it is for, in the brewer's words. */
  name: f.name,
  showPrices: z.boolean(),
  createdBy: f.name,
  createdOn: f.day,
  /** The last day on which it works, in the brewery's time zone. */
  expiresOn: f.day,
  withdrawnAt: z.iso.datetime().nullable(),
  /** By people who are not of the brewery. */
  visits: z.number().int().min(0),
  lastVisitAt: z.iso.datetime().nullable(),
});
export type ShareLink = z.infer<typeof shareLink>;

const facts = { name: f.name, expiresOn: f.day, showPrices: z.boolean() };
export const shareLinkRequest = z.strictObject({ id: f.id, ...facts });
export type ShareLinkRequest = z.infer<typeof shareLinkRequest>;
export const shareLinkPatch = z.strictObject(facts).partial();
export type ShareLinkPatch = z.infer<typeof shareLinkPatch>;

/** The token is in this answer and nowhere else; only its hash is stored. */
export const shareLinkMade = shareLink.extend({ token: z.string() });
export type ShareLinkMade = z.infer<typeof shareLinkMade>;

/**
 * What a link shows: one chain and what its verdicts are computed from. Its ids are numbers made
 * for this answer; names of people and notes are left out.
 */
export const sharedChain = z.strictObject({
  breweryName: f.name,
  currency: z.string(),
  units: unitPrefs,
  today: f.day,
  sharedOn: f.day,
  /** The last day on which the link works. */
  until: f.day,
  houseRules: houseRuleChanges,
  chain,
  /** It starts from a cake of another chain, of which only what it hands down is told. */
  startsFromCake: z.boolean(),
  yeasts: z.array(yeast),
  vessels: z.array(vessel),
  batches: z.array(batch),
  /** What may be in any of the beers. */
  carries: z.strictObject({
    allergens: z.array(z.enum(ALLERGENS)),
    allergensUnknown: z.boolean(),
    cultures: z.array(z.enum(CULTURES)),
    culturesUnknown: z.boolean(),
  }),
  /** Minor units; null: not told, or not known. */
  costPerBatch: f.moneyMinor.nullable(),
});
export type SharedChain = z.infer<typeof sharedChain>;

/** Copies the chain behind a link into a brewery; `id` becomes the new chain's. */
export const copyRequest = z.strictObject({ id: f.id, token: z.string().min(1).max(200) });
export type CopyRequest = z.infer<typeof copyRequest>;
