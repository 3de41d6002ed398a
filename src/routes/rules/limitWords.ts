import type { HouseRuleChanges } from '#shared/api/board.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { houseRuleValue } from '#shared/rules/houseRuleWords.ts';
import { limitIssue, LIMIT_PAIRS } from '#shared/rules/resolve.ts';
import type { NumberKind } from '../../components/form/readers.ts';

/** How a limit is read and written as a field. */
export function kindOf(key: HouseRuleKey): NumberKind {
  switch (HOUSE_RULES[key].unit) {
    case 'SRM':
      return 'colour';
    case 'IBU':
      return 'bitterness';
    case 'g/L':
      return 'hopRate';
    case 'SG':
      return 'gravity';
    case '°C':
      return 'temperatureStep';
    case '%':
      return 'alcohol';
    case 'share':
      return 'percent';
    case 'days':
      return 'days';
    case 'generations':
    case 'beers':
    case 'minutes':
      return 'count';
    case 'points':
    case 'ΔE00':
    case '× need':
      return 'number';
  }
}

/** Units that no field has of its own, as they stand behind the number. */
const PLAIN_UNITS: Partial<Record<(typeof HOUSE_RULES)[HouseRuleKey]['unit'], string>> = {
  points: 'points',
  ΔE00: 'ΔE',
  '× need': 'times the need',
  minutes: 'minutes',
};

export const unitWord = (key: HouseRuleKey, unit: string): string =>
  PLAIN_UNITS[HOUSE_RULES[key].unit] ?? (unit === 'SG' ? '' : unit);

/** What is wrong with a limit's value, in the reader's units; null: nothing. */
export function boundFault(key: HouseRuleKey, value: number, units: UnitPrefs): string | null {
  const { min, max } = HOUSE_RULES[key];
  if (value >= min && value <= max) return null;
  return `Between ${houseRuleValue(key, min, units)} and ${houseRuleValue(key, max, units)}`;
}

/** Limits that are out of order, each told at the one that was changed. */
export function orderFaults(
  changes: HouseRuleChanges,
  units: UnitPrefs,
): Partial<Record<HouseRuleKey, string>> {
  const faults: Partial<Record<HouseRuleKey, string>> = {};
  for (const pair of LIMIT_PAIRS) {
    const issue = limitIssue(pair, changes);
    if (!issue || issue.key === 'softened') continue;
    const atMind = issue.key === pair.mind;
    const other = atMind ? pair.hold : pair.mind;
    const changed = changes[other];
    const value = changed === undefined ? HOUSE_RULES[other].default : changed;
    const side = (pair.way === 'rising') === atMind ? 'At most' : 'At least';
    const begins = atMind ? 'where the Hold begins' : 'where the Mind begins';
    faults[issue.key] ??= `${side} ${houseRuleValue(other, value, units)}, ${begins}`;
  }
  return faults;
}
