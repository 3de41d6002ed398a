import { z } from 'zod';
import { HOUSE_RULES, type HouseRuleKey } from '../rules/houseRules.ts';
import { RULE_IDS } from '../rules/vocabulary.ts';
import { batch } from './batch.ts';
import { brewery, season } from './brewery.ts';
import { chain } from './chain.ts';
import * as f from './fields.ts';
import { guestShelf } from './guest.ts';
import { abilities, member, role } from './people.ts';
import { vessel } from './vessel.ts';
import { yeast } from './yeast.ts';

/** The one rule that can be switched off: null. */
type Switched = 'jumpHold';
type Limit = Exclude<HouseRuleKey, Switched>;

const within = (key: HouseRuleKey) =>
  z.number().min(HOUSE_RULES[key].min).max(HOUSE_RULES[key].max);

const limits = Object.fromEntries(
  Object.keys(HOUSE_RULES)
    .filter((key): key is Limit => key !== ('jumpHold' satisfies Switched))
    .map((key) => [key, within(key).optional()]),
) as { [K in Limit]: z.ZodOptional<z.ZodNumber> };

/** Only what differs from the default. Bounds and the order of limits: `shared/rules/houseRules`. */
export const houseRuleChanges: z.ZodType<HouseRuleChanges> = z.strictObject({
  ...limits,
  jumpHold: within('jumpHold').nullable().optional(),
  softened: z.array(z.enum(RULE_IDS)).optional(),
});
export type HouseRuleChanges = { [K in Limit]?: number } & {
  [K in Switched]?: number | null;
} & { softened?: (typeof RULE_IDS)[number][] };

/** A season's board, whole: one request. The verdicts are computed from it by `shared/chain`. */
export const board = z.strictObject({
  brewery,
  season,
  /** Today in the brewery's time zone. */
  today: f.day,
  me: z.strictObject({ personId: f.id, role, can: abilities }),
  houseRules: houseRuleChanges,
  members: z.array(member),
  yeasts: z.array(yeast),
  vessels: z.array(vessel),
  chains: z.array(chain),
  batches: z.array(batch),
  /** The newest of one's own changes that can be undone, and the newest undone one. */
  undo: z.strictObject({ id: f.id, what: z.string() }).nullable(),
  redo: z.strictObject({ id: f.id, what: z.string() }).nullable(),
  /** Comments of others that one has not seen, by chain; a chain without any is left out. */
  unread: z.record(f.id, z.number().int().min(1)),
  /** Shelves of other breweries on which this person is a guest. */
  guests: z.array(guestShelf),
});
export type Board = z.infer<typeof board>;
