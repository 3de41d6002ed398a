import { z } from 'zod';
import { limitIssue, LIMIT_PAIRS, softenedIssue } from '../rules/resolve.ts';
import { houseRuleChanges, type HouseRuleChanges } from './board.ts';
import * as f from './fields.ts';

/** One change of the house rules in the record. */
export const houseRulesPast = z.strictObject({
  id: f.id,
  at: z.iso.datetime(),
  day: f.day,
  by: z.string(),
  what: z.string(),
  facts: z.array(
    z.strictObject({
      label: z.string(),
      from: z.string().nullable(),
      to: z.string().nullable(),
    }),
  ),
});
export type HouseRulesPast = z.infer<typeof houseRulesPast>;

export const houseRules = z.strictObject({
  version: f.version,
  /** Only what differs from the defaults. */
  changes: houseRuleChanges,
  /** Newest first, over all seasons. */
  history: z.array(houseRulesPast),
});
export type HouseRulesRow = z.infer<typeof houseRules>;

/** All changes as they shall stand; limits in order, nothing softened that may not be. */
export const houseRulesRequest: z.ZodType<HouseRuleChanges> = houseRuleChanges.superRefine(
  (changes, ctx) => {
    // The bounds are the contract's own; one word at a field is enough.
    const told = new Set<string>(ctx.issues.map(({ path }) => String(path?.[0])));
    const issues = [
      ...LIMIT_PAIRS.map((pair) => limitIssue(pair, changes)),
      softenedIssue(changes.softened),
    ];
    for (const issue of issues) {
      if (!issue || told.has(issue.key)) continue;
      told.add(issue.key);
      ctx.addIssue({ code: 'custom', path: [issue.key], message: issue.detail });
    }
  },
);
