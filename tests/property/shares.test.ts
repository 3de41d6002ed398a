import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { allot, type AskedPart } from '#shared/chain/shares.ts';

const litres = fc.double({ min: 0, max: 6, noNaN: true });
const asked: fc.Arbitrary<AskedPart> = fc.oneof(
  litres,
  fc.constant('recommended' as const),
  fc.constant('rest' as const),
);
const wishes = fc.array(fc.record({ asked, recommendedL: fc.oneof(litres, fc.constant(null)) }), {
  maxLength: 6,
});
const sum = (parts: readonly (number | null)[]) =>
  parts.reduce<number>((all, part) => all + (part ?? 0), 0);
/** Adding in another order than taking away leaves a trace in the last digit. */
const TRACE = 1e-9;

describe('the parts of one cake', () => {
  it('are never more than the cake, and none is less than nothing', () => {
    fc.assert(
      fc.property(litres, wishes, (wholeL, all) => {
        const parts = allot(wholeL, all);
        expect(parts).toHaveLength(all.length);
        expect(sum(parts)).toBeLessThanOrEqual(wholeL + TRACE);
        for (const part of parts) expect(part ?? 0).toBeGreaterThanOrEqual(0);
      }),
    );
  });

  it('are all that was named, where that fits', () => {
    fc.assert(
      fc.property(fc.array(litres, { maxLength: 5 }), wishes, (named, others) => {
        const wholeL = sum(named) + TRACE;
        const vague = others.filter((wish) => typeof wish.asked !== 'number');
        const wished = named.map((part) => ({ asked: part, recommendedL: null }));
        expect(allot(wholeL, [...vague, ...wished]).slice(vague.length)).toEqual(
          named.map((part) => expect.closeTo(part, 6)),
        );
      }),
    );
  });

  it('leave nothing over where somebody takes the rest', () => {
    fc.assert(
      fc.property(litres, wishes, (wholeL, all) => {
        const parts = allot(wholeL, [...all, { asked: 'rest', recommendedL: null }]);
        expect(sum(parts)).toBeCloseTo(wholeL, 6);
      }),
    );
  });

  it('grow for nobody when another is promised more', () => {
    fc.assert(
      fc.property(litres, litres, litres, wishes, (wholeL, part, more, others) => {
        const first = (asked: number) => ({ asked, recommendedL: null });
        const before = allot(wholeL, [first(part), ...others]);
        const after = allot(wholeL, [first(part + more), ...others]);
        const gains = after.slice(1).map((is, at) => (is ?? 0) - (before[at + 1] ?? 0));
        expect(Math.max(0, ...gains)).toBeLessThanOrEqual(TRACE);
      }),
    );
  });
});
