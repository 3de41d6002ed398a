import type { HouseRuleChanges } from '../api/board.ts';
import type { UnitPrefs } from '../api/units.ts';
import { HOUSE_RULES, type HouseRuleKey } from '../rules/houseRules.ts';
import { HOUSE_RULE_WORDS, houseRuleValue } from '../rules/houseRuleWords.ts';
import { RULE_NAMES } from '../rules/ruleNames.ts';
import { RULE_IDS } from '../rules/vocabulary.ts';
import { factSentence, type FactChange } from './facts.ts';
import type { Told } from './sentences.ts';

const KEYS = Object.keys(HOUSE_RULES) as HouseRuleKey[];

/** What differs between two states of a brewery's house rules, softened rules among it. */
export function houseRuleFacts(
  before: HouseRuleChanges,
  after: HouseRuleChanges,
  units: UnitPrefs,
): FactChange[] {
  const standing = (changes: HouseRuleChanges, key: HouseRuleKey) => {
    const value = changes[key];
    return value === undefined ? HOUSE_RULES[key].default : value;
  };
  const limits = KEYS.flatMap((key) => {
    const [was, is] = [standing(before, key), standing(after, key)];
    if (was === is) return [];
    const [from, to] = [houseRuleValue(key, was, units), houseRuleValue(key, is, units)];
    return [{ label: HOUSE_RULE_WORDS[key], from, to }];
  });
  const softened = RULE_IDS.flatMap((rule) => {
    const [was, is] = [isSoft(before, rule), isSoft(after, rule)];
    if (was === is) return [];
    const label = `a hold of “${RULE_NAMES[rule]}”`;
    return [{ label, from: shownAs(was), to: shownAs(is) }];
  });
  return [...limits, ...softened];
}

const isSoft = ({ softened = [] }: HouseRuleChanges, rule: (typeof RULE_IDS)[number]) =>
  softened.includes(rule);
const shownAs = (soft: boolean) => (soft ? 'a Mind' : 'a Hold');

/** "Set the colour shift for a Hold of the house rules from ΔE 3 to ΔE 4". */
export function tellHouseRules(
  before: HouseRuleChanges,
  after: HouseRuleChanges,
  units: UnitPrefs,
): Told {
  const facts = houseRuleFacts(before, after, units);
  const isBack = Object.keys(after).length === 0 && facts.length > 1;
  const whole = isBack ? 'Put the house rules back to the defaults' : 'Changed the house rules';
  return { what: isBack ? whole : factSentence('of the house rules', whole, facts), facts };
}
