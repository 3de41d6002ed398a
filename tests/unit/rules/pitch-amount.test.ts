import { describe, expect, test } from 'vitest';
import type { PourFacts } from '#shared/rules/facts.ts';
import {
  blonde,
  check,
  checkAsDated,
  CLEAN_ALE,
  missingFor,
  paleAle,
  standing,
} from '../../support/links.ts';

/** A pour of the part that holds this many times the need. */
const partFor = (ratio: number): PourFacts => {
  const whole = check({ a: blonde(), b: paleAle() }).keep;
  return { keepL: ((whole.keptL ?? 0) * ratio) / (whole.ratio ?? 1) };
};
const at = (ratio: number, character: boolean | undefined = false) =>
  standing(
    check({ a: blonde(), b: paleAle(), pour: partFor(ratio), yeast: { ...CLEAN_ALE, character } }),
    'pitch-amount',
  );

describe('pitch-amount', () => {
  test.each([
    [0.599, 'hold'],
    [0.6, 'mind'],
    [0.999, 'mind'],
    [1, 'passed'],
    [5, 'passed'],
  ])('%d times the need: %s', (ratio, expected) => expect(at(ratio)).toBe(expected));

  test.each([
    [3.99, 'passed'],
    [4, 'mind'],
  ])('%d times the need of a yeast with character: %s', (ratio, expected) =>
    expect(at(ratio, true)).toBe(expected),
  );

  test('nothing kept is a hold, whatever is unknown', () => {
    expect(at(0)).toBe('hold');
    const { og: _o, volumeL: _v, ...unknown } = paleAle();
    const link = check({ a: { id: 'a' }, b: unknown, pour: { keepL: 0 } });
    expect(standing(link, 'pitch-amount')).toBe('hold');
    expect(link.keep).toMatchObject({ keptL: 0, ratio: 0 });
  });

  test('more than there is counts as all of it, with advice', () => {
    const whole = check({ a: blonde(), b: paleAle() });
    const more = check({ a: blonde(), b: paleAle(), pour: { keepL: 50 } });
    expect(more.keep.keptL).toBe(whole.keep.keptL);
    expect(more.blend).toEqual(whole.blend);
    expect(more.advice.map((one) => one.id)).toContain('kept-all-there-is');
    expect(whole.advice.map((one) => one.id)).not.toContain('kept-all-there-is');
  });

  test('the recommended part is enough at the low end, and is no part at all where unknown', () => {
    const part = check({ a: blonde(), b: paleAle(), pour: { keepL: 'recommended' } });
    expect(part.keep.keptL).toBe(part.keep.recommendedL);
    expect(standing(part, 'pitch-amount')).toBe('passed');
    const { og: _o, ...unknown } = paleAle();
    const open = check({ a: blonde(), b: unknown, pour: { keepL: 'recommended' } });
    expect(open.keep.recommendedL).toBeNull();
    expect(open.cake.volumeL).not.toBeNull();
    expect(open.keep.keptL).toBeNull();
    expect(standing(open, 'pitch-amount')).toBe('unchecked');
  });

  test('without dates a part that is too small even when fresh is found all the same', () => {
    const { brewOn: _b, ...undated } = blonde();
    const link = (ratio: number) =>
      checkAsDated({ a: undated, b: paleAle(), pour: partFor(ratio) });
    expect(standing(link(0.5), 'pitch-amount')).toBe('hold');
    expect(standing(link(0.9), 'pitch-amount')).toBe('mind');
    expect(missingFor(link(2), 'pitch-amount')).toEqual(['brewOn']);
  });

  test('an unknown character matters only from 4 times the need', () => {
    const { character: _c, ...open } = CLEAN_ALE;
    const link = (ratio: number) =>
      check({ a: blonde(), b: paleAle(), pour: partFor(ratio), yeast: open });
    expect(standing(link(3.99), 'pitch-amount')).toBe('passed');
    expect(missingFor(link(4), 'pitch-amount')).toEqual(['character']);
  });
});
