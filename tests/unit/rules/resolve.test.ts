import { describe, expect, test } from 'vitest';
import { HOUSE_RULES, type HouseRuleKey } from '#shared/rules/houseRules.ts';
import { DEFAULT_HOUSE_RULES, LIMIT_PAIRS, resolveHouseRules } from '#shared/rules/resolve.ts';
import { check, blonde, paleAle, standing, ale } from '../../support/links.ts';

const keysOf = (changes: Parameters<typeof resolveHouseRules>[0]): string[] => {
  const resolved = resolveHouseRules(changes);
  return resolved.ok ? [] : resolved.issues.map((issue) => issue.key);
};

describe('resolveHouseRules', () => {
  test('no change is the defaults, which are in order and within their bounds', () => {
    expect(resolveHouseRules({})).toEqual({ ok: true, rules: DEFAULT_HOUSE_RULES });
    expect(resolveHouseRules({ jumpHold: null, softened: [] }).ok).toBe(true);
  });

  test('a change replaces its default only', () => {
    const resolved = resolveHouseRules({ darkSrm: 5 });
    expect(resolved).toEqual({ ok: true, rules: { ...DEFAULT_HOUSE_RULES, darkSrm: 5 } });
  });

  test.each(Object.keys(HOUSE_RULES) as HouseRuleKey[])('%s keeps to its bounds', (key) => {
    const { min, max } = HOUSE_RULES[key];
    expect(keysOf({ [key]: min - 0.01 })).toContain(key);
    expect(keysOf({ [key]: max + 0.01 })).toContain(key);
    expect(keysOf({ [key]: Number.NaN })).toContain(key);
  });

  test.each(LIMIT_PAIRS)('$mind may not be looser than $hold', ({ mind, hold, way }) => {
    const { min, max } = HOUSE_RULES[hold];
    const middle =
      (Math.max(min, HOUSE_RULES[mind].min) + Math.min(max, HOUSE_RULES[mind].max)) / 2;
    const looser = way === 'rising' ? middle + 1e-4 : middle - 1e-4;
    expect(keysOf({ [mind]: looser, [hold]: middle })).toContain(mind);
    const issues = resolveHouseRules({ [mind]: middle, [hold]: middle });
    const own = issues.ok ? [] : issues.issues.filter((one) => one.detail.includes(`${hold} is`));
    expect(own.filter((one) => one.key === mind)).toEqual([]);
  });

  test('the issue lies at the key that was changed, and all come at once', () => {
    expect(keysOf({ tiredOgHold: 1.05 })).toEqual(['tiredOgHold']);
    expect(keysOf({ darkSrm: 99, jumpHold: 30, survivalMind: 0.5 })).toEqual([
      'darkSrm',
      'jumpHold',
      'survivalMind',
    ]);
  });

  test('allergens and wild cultures cannot be softened', () => {
    expect(keysOf({ softened: ['allergen'] })).toEqual(['softened']);
    expect(keysOf({ softened: ['tired-cake', 'wild-culture'] })).toEqual(['softened']);
    expect(keysOf({ softened: ['tired-cake'] })).toEqual([]);
  });

  test('a softened hold is told as a mind', () => {
    const tired = { a: ale('a', 1.09, 6, 25), b: ale('b', 1.09, 6, 25) };
    const softened = new Set(['tired-cake'] as const);
    expect(standing(check(tired), 'tired-cake')).toBe('hold');
    expect(standing(check({ ...tired, rules: { softened } }), 'tired-cake')).toBe('mind');
    expect(check({ a: blonde(), b: paleAle(), rules: { softened } }).verdict).toBe('pour');
  });
});
