import { describe, expect, test } from 'vitest';
import type { Addition } from '#shared/rules/facts.ts';
import type { AdditionKind, Timing } from '#shared/rules/vocabulary.ts';
import { blonde, check, missingFor, paleAle, standing } from '../../support/links.ts';

const RULE = 'flavour-left';
const put = (what: AdditionKind, timing: Timing = 'on-cake'): Addition => ({ what, timing });
const link = (a: Addition[], b: Addition[] = []) =>
  check({ a: { ...blonde(), additions: a }, b: { ...paleAle(), additions: b } });

describe('flavour-left', () => {
  test.each(['fruit', 'spice', 'coffee', 'vanilla', 'wood', 'lactose'] as const)(
    '%s is a mind',
    (what) => {
      expect(standing(link([put(what)]), RULE)).toBe('mind');
      expect(standing(link([put(what)], [put(what, 'after-taking')]), RULE)).toBe('passed');
      expect(standing(link([put(what, 'after-taking')]), RULE)).toBe('passed');
    },
  );

  test.each(['smoke', 'chilli'] as const)('%s is a hold', (what) => {
    expect(standing(link([put(what)]), RULE)).toBe('hold');
    expect(standing(link([put(what)], [put(what)]), RULE)).toBe('passed');
  });

  test('another addition leaves nothing that is known', () =>
    expect(standing(link([put('other')]), RULE)).toBe('passed'));

  test('unknown additions', () => {
    const { additions: _a, ...earlier } = blonde();
    const { additions: _b, ...later } = paleAle();
    expect(missingFor(check({ a: earlier, b: paleAle() }), RULE)).toEqual(['additions']);
    expect(standing(check({ a: blonde(), b: later }), RULE)).toBe('passed');
    const coffee = { ...blonde(), additions: [put('coffee')] };
    expect(missingFor(check({ a: coffee, b: later }), RULE)).toEqual(['additions']);
  });
});
