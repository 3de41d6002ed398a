import type { HouseRuleChanges } from '#shared/api/board.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { RULE_IDS, type RuleId } from '#shared/rules/vocabulary.ts';
import { written, type Written } from '../../components/form/written.ts';
import { boundFault, kindOf, orderFaults } from './limitWords.ts';
import type { Explained } from '../checks/rulesExplained.ts';
import { RULE_SENTENCES } from './ruleSentences.ts';

const KEYS = Object.keys(HOUSE_RULES) as HouseRuleKey[];

/** What stands in the fields, as it was typed. */
export interface Draft {
  limits: Readonly<Record<HouseRuleKey, Written>>;
  softened: readonly RuleId[];
}

const standing = (changes: HouseRuleChanges, key: HouseRuleKey): number | null => {
  const value = changes[key];
  return value === undefined ? HOUSE_RULES[key].default : value;
};

export function draftOf(changes: HouseRuleChanges, units: UnitPrefs): Draft {
  const fields = KEYS.map(
    (key) => [key, written(kindOf(key), standing(changes, key), units)] as const,
  );
  return {
    limits: Object.fromEntries(fields) as Record<HouseRuleKey, Written>,
    softened: changes.softened ?? [],
  };
}

/** What would be saved: only what differs from the defaults. A field that cannot be read is left out. */
export function changesOf({ limits, softened }: Draft): HouseRuleChanges {
  const changed = KEYS.flatMap((key) => {
    const { value, why } = limits[key];
    if (why !== null || value === HOUSE_RULES[key].default) return [];
    return value === null && key !== 'jumpHold' ? [] : [[key, value] as const];
  });
  const soft = RULE_IDS.filter((rule) => softened.includes(rule));
  return {
    ...(Object.fromEntries(changed) as HouseRuleChanges),
    ...(soft.length > 0 && { softened: soft }),
  };
}

export type Faults = Partial<Record<HouseRuleKey, string>>;

/** What is wrong, at the field that it is wrong with. */
export function faultsOf(draft: Draft, units: UnitPrefs): Faults {
  const faults: Faults = {};
  for (const key of KEYS) {
    const { value, why } = draft.limits[key];
    const missing = value === null && key !== 'jumpHold' ? 'Write a number' : null;
    const fault = why ?? missing ?? (value === null ? null : boundFault(key, value, units));
    if (fault !== null) faults[key] = fault;
  }
  return { ...orderFaults(changesOf(draft), units), ...faults };
}

/** The limits that stand in a rule's sentences. */
export const limitsOf = (rule: Explained['id']): HouseRuleKey[] =>
  (RULE_SENTENCES[rule] ?? [])
    .flat()
    .flatMap((part) => (typeof part === 'string' ? [] : part.limit));

/** True where a rule stands as it does without house rules. */
export const isDefault = (draft: Draft, rule: Explained['id']): boolean =>
  !draft.softened.some((each) => each === rule) &&
  limitsOf(rule).every((key) => {
    const { value, why } = draft.limits[key];
    return why === null && value === HOUSE_RULES[key].default;
  });

/** A rule put back to its default, the others as they are. */
export function backToDefault(draft: Draft, rule: Explained['id'], units: UnitPrefs): Draft {
  const fresh = draftOf({}, units);
  const limits = { ...draft.limits };
  for (const key of limitsOf(rule)) limits[key] = fresh.limits[key];
  return { limits, softened: draft.softened.filter((each) => each !== rule) };
}
