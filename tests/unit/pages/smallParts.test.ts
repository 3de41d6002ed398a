import { describe, expect, it } from 'vitest';
import { RULE_IDS } from '#shared/rules/vocabulary.ts';
import { dayAndTime } from '../../../src/app/zonedTime.ts';
import { usualFg } from '../../../src/routes/batch-form/usual.ts';
import { RULES_EXPLAINED } from '../../../src/routes/checks/rulesExplained.ts';
import { safeNext } from '../../../src/routes/public/home.ts';
import { initialsOf } from '../../../src/routes/shell/initials.ts';

describe('where to go after signing in', () => {
  it.each(['https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', '', null])(
    'is not %s',
    (next) => expect(safeNext(next)).toBeNull(),
  );
  it('is a page of this site', () => {
    expect(safeNext('/b/saltmarsh?batch=1')).toBe('/b/saltmarsh?batch=1');
  });
});

describe('the page about the checks', () => {
  it('explains each rule once', () => {
    expect(RULES_EXPLAINED.map((rule) => rule.id).toSorted()).toEqual([...RULE_IDS].toSorted());
  });
  it('says of each what minds or holds, and what it rests on', () => {
    for (const rule of RULES_EXPLAINED) {
      expect(rule.minds ?? rule.holds, rule.id).toBeTruthy();
      expect(rule.basis, rule.id).toMatch(/\.$/);
    }
  });
});

describe('the usual final gravity', () => {
  // (1.052 − 1) × (1 − 0.75) = 0.013, by hand.
  it('is what the attenuation leaves of the points', () => {
    expect(usualFg(1.052, 0.75)).toBe(1.013);
    expect(usualFg(null, 0.75)).toBeNull();
  });
});

describe('a day and a time', () => {
  it('are told by the clock of the brewery', () => {
    expect(dayAndTime('2026-12-08T23:30:00.000Z', 'Europe/Berlin')).toBe('Wed 9 December, 00:30');
    expect(dayAndTime('2026-12-08T23:30:00.000Z', 'America/New_York')).toBe(
      'Tue 8 December, 18:30',
    );
  });
});

describe('initials', () => {
  it.each([
    ['Mo', 'MO'],
    ['Wren Halloway', 'WH'],
    ['ana maría de la cruz', 'AC'],
  ])('of %s are %s', (name, initials) => expect(initialsOf(name)).toBe(initials));
});
