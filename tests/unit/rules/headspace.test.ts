import { describe, expect, test } from 'vitest';
import type { VesselFacts } from '#shared/rules/facts.ts';
import { ale, check, missingFor, standing } from '../../support/links.ts';

/** A vessel with this share of B's 23 L free; keeping nothing leaves the arithmetic plain. */
const answer = (free: number, og = 1.05, vessel: VesselFacts = { blowOff: false }) =>
  check({
    a: ale('a', 1.05, 6, 25),
    b: ale('b', og, 6, 25),
    pour: { keepL: 0 },
    rest: { vessel: { capacityL: 23 * (1 + free), ...vessel } },
  });
const at = (...of: Parameters<typeof answer>) => standing(answer(...of), 'headspace');

describe('headspace', () => {
  test.each([
    [0.2, 1.05, 'passed'],
    [0.199, 1.05, 'mind'],
    [0.05, 1.05, 'mind'],
    [0.049, 1.05, 'hold'],
    [-0.1, 1.05, 'hold'],
    [0.2, 1.0649, 'passed'],
    [0.25, 1.065, 'passed'],
    [0.249, 1.065, 'mind'],
  ])('%d free under a wort of %d: %s', (free, og, expected) => expect(at(free, og)).toBe(expected));

  test.each([
    [0.12, 'passed'],
    [0.119, 'mind'],
    [0.049, 'hold'],
  ])('%d free with a blow-off tube: %s', (free, expected) => {
    expect(at(free, 1.05, { blowOff: true })).toBe(expected);
    expect(at(free, 1.08, { blowOff: true })).toBe(expected);
  });

  test('cake and beer left above take their room', () => {
    const kept = (keepL: number) => {
      const free = check({
        a: ale('a', 1.05, 6, 25),
        b: ale('b', 1.05, 6, 25),
        pour: { keepL, leftAboveL: 2 },
        rest: { vessel: { capacityL: 28.7, blowOff: false } },
      });
      return standing(free, 'headspace');
    };
    // 5.7 L above 23 L are 24.8 %; half of the 1.6 L cake and half of 2 L leave 17 %.
    expect(kept(0)).toBe('passed');
    expect(kept(0.8)).toBe('mind');
  });

  test('B’s own vessel counts before the chain’s', () => {
    const own = check({
      a: ale('a', 1.05, 6, 25),
      b: ale('b', 1.05, 6, 25),
      pour: { vessel: { capacityL: 23.5, blowOff: false } },
    });
    expect(standing(own, 'headspace')).toBe('hold');
  });

  test('what is known may decide without the rest', () => {
    const { fg: _f, ...noCake } = ale('a', 1.05, 6, 25);
    const b = ale('b', 1.05, 6, 25);
    const within = (capacityL: number) =>
      check({ a: noCake, b, rest: { vessel: { capacityL, blowOff: false } } });
    expect(standing(within(24), 'headspace')).toBe('hold');
    expect(standing(within(27), 'headspace')).toBe('mind');
    expect(missingFor(within(32), 'headspace')).toEqual(['fg']);
    expect(missingFor(check({ a: noCake, b, rest: { vessel: undefined } }), 'headspace')).toContain(
      'vessel',
    );
    const { og: _o, ...noGravity } = b;
    const strongOrNot = (capacityL: number) =>
      check({
        a: ale('a', 1.05, 6, 25),
        b: noGravity,
        pour: { keepL: 0 },
        rest: { vessel: { capacityL, blowOff: false } },
      });
    expect(standing(strongOrNot(28.75), 'headspace')).toBe('passed');
    expect(missingFor(strongOrNot(28), 'headspace')).toEqual(['og']);
    expect(standing(strongOrNot(27), 'headspace')).toBe('mind');
    expect(missingFor(answer(0.15, 1.05, {}), 'headspace')).toEqual(['blowOff']);
  });
});
