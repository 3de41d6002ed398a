import { describe, expect, test } from 'vitest';
import type { Addition } from '#shared/rules/facts.ts';
import { blonde, check, missingFor, paleAle, standing } from '../../support/links.ts';

const RULE = 'stopped-yeast';
const link = (...additions: Addition[]) => check({ a: { ...blonde(), additions }, b: paleAle() });

describe('stopped-yeast', () => {
  test('a stabiliser before the taking holds, after it passes', () => {
    expect(standing(link({ what: 'stabiliser', timing: 'on-cake' }), RULE)).toBe('hold');
    expect(standing(link({ what: 'stabiliser', timing: 'after-taking' }), RULE)).toBe('passed');
    expect(standing(link({ what: 'coffee', timing: 'on-cake' }), RULE)).toBe('passed');
  });

  test('it may be softened, and unknown additions are unchecked', () => {
    const soft = check({
      a: { ...blonde(), additions: [{ what: 'stabiliser', timing: 'on-cake' }] },
      b: paleAle(),
      rules: { softened: new Set([RULE]) },
    });
    expect(standing(soft, RULE)).toBe('mind');
    const { additions: _a, ...open } = blonde();
    expect(missingFor(check({ a: open, b: paleAle() }), RULE)).toEqual(['additions']);
  });
});
