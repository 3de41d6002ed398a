import type { HouseRuleChanges } from '../api/board.ts';
import { HOUSE_RULES, type HouseRuleKey } from './houseRules.ts';
import type { RuleId } from './vocabulary.ts';

/** Every threshold as it stands for a brewery: its own changes over the defaults. */
export type HouseRules = Readonly<
  Record<Exclude<HouseRuleKey, 'jumpHold'>, number> & {
    /** Null: a jump is never held. */
    jumpHold: number | null;
    /** Rules whose hold is shown as a mind. */
    softened: ReadonlySet<RuleId>;
  }
>;

export interface HouseRuleIssue {
  key: HouseRuleKey | 'softened';
  detail: string;
}

/** Rules that nobody may soften: what they warn of can hurt a drinker or a whole chain. */
export const NEVER_SOFTENED: readonly RuleId[] = ['allergen', 'wild-culture'];

interface LimitPair {
  mind: HouseRuleKey;
  hold: HouseRuleKey;
  /** `rising`: the finding comes as the figure grows, so a mind may not lie above its hold. */
  way: 'rising' | 'falling';
}

/** Each mind limit beside the hold limit of the same figure. */
export const LIMIT_PAIRS: readonly LimitPair[] = [
  { mind: 'colourShiftMind', hold: 'colourShiftHold', way: 'rising' },
  { mind: 'bitterGapMind', hold: 'bitterGapHold', way: 'rising' },
  { mind: 'bitterShiftMind', hold: 'bitterShiftHold', way: 'rising' },
  { mind: 'bitterShiftMind', hold: 'bitterShiftAlone', way: 'rising' },
  { mind: 'hopsMind', hold: 'hopsHoldPlain', way: 'rising' },
  { mind: 'hopsMind', hold: 'hopsHold', way: 'rising' },
  { mind: 'jumpMind', hold: 'jumpHold', way: 'rising' },
  { mind: 'fallMind', hold: 'fallHold', way: 'rising' },
  { mind: 'tiredOgMind', hold: 'tiredOgHold', way: 'rising' },
  { mind: 'tiredAbvMind', hold: 'tiredAbvHold', way: 'rising' },
  { mind: 'survivalMind', hold: 'survivalHold', way: 'falling' },
  { mind: 'underBeerMind', hold: 'underBeerHold', way: 'rising' },
  { mind: 'underBeerMindLager', hold: 'underBeerHoldLager', way: 'rising' },
  { mind: 'pitchMind', hold: 'pitchHold', way: 'falling' },
  { mind: 'freeMind', hold: 'freeHold', way: 'falling' },
  { mind: 'freeMindStrong', hold: 'freeHold', way: 'falling' },
  { mind: 'freeBlowOff', hold: 'freeHold', way: 'falling' },
];

const defaults = Object.fromEntries(
  Object.entries(HOUSE_RULES).map(([key, rule]) => [key, rule.default]),
) as Record<Exclude<HouseRuleKey, 'jumpHold'>, number> & { jumpHold: number | null };

export const DEFAULT_HOUSE_RULES: HouseRules = { ...defaults, softened: new Set<RuleId>() };

function boundIssues(changes: HouseRuleChanges): HouseRuleIssue[] {
  const issues: HouseRuleIssue[] = [];
  for (const key of Object.keys(HOUSE_RULES) as HouseRuleKey[]) {
    const value = changes[key];
    const { min, max } = HOUSE_RULES[key];
    if (value !== undefined && value !== null && !(value >= min && value <= max))
      issues.push({ key, detail: `Between ${min} and ${max}` });
  }
  return issues;
}

/** The issue of one pair of limits, or null. It lies at the key that the brewery changed. */
export function limitIssue(pair: LimitPair, changes: HouseRuleChanges): HouseRuleIssue | null {
  const value = (key: HouseRuleKey) => changes[key] ?? defaults[key];
  const mind = value(pair.mind);
  const hold = value(pair.hold);
  if (mind === null || hold === null) return null;
  if (pair.way === 'rising' ? mind <= hold : mind >= hold) return null;
  return changes[pair.mind] === undefined
    ? { key: pair.hold, detail: `A hold cannot be stricter than its mind: ${pair.mind} is ${mind}` }
    : { key: pair.mind, detail: `A mind cannot be looser than its hold: ${pair.hold} is ${hold}` };
}

/** The issue of softening a rule that may not be softened, or null. */
export function softenedIssue(softened: readonly RuleId[] | undefined): HouseRuleIssue | null {
  const refused = softened?.find((rule) => NEVER_SOFTENED.includes(rule));
  return refused === undefined
    ? null
    : { key: 'softened', detail: `${refused} cannot be softened: declare it, or do not pour` };
}

/**
 * A brewery's changes over the defaults. Refused with every issue at once: a value out of bounds,
 * a mind limit looser than its hold limit, a softened allergen or wild culture.
 */
export function resolveHouseRules(
  changes: HouseRuleChanges,
): { ok: true; rules: HouseRules } | { ok: false; issues: HouseRuleIssue[] } {
  const issues = boundIssues(changes);
  for (const pair of LIMIT_PAIRS) {
    const issue = limitIssue(pair, changes);
    if (issue) issues.push(issue);
  }
  const soft = softenedIssue(changes.softened);
  if (soft) issues.push(soft);
  if (issues.length > 0) return { ok: false, issues };
  const { softened, ...limits } = changes;
  const given = Object.fromEntries(Object.entries(limits).filter(([, v]) => v !== undefined));
  return { ok: true, rules: { ...defaults, ...given, softened: new Set(softened) } };
}
