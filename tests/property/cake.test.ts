import fc from 'fast-check';
import { expect, test } from 'vitest';
import { blend, retainedBeerL } from '#shared/cake/blend.ts';
import { estimateCake } from '#shared/cake/estimate.ts';
import { recommendedKeep } from '#shared/cake/keep.ts';

const between = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const beer = fc
  .record({
    volumeL: between(0.5, 5000),
    og: between(1.001, 1.2),
    ferments: between(0, 1),
    kind: fc.constantFrom('ale', 'lager'),
    trub: fc.constantFrom('little', 'some', 'much'),
    survival: between(1e-6, 1),
  })
  .map(({ ferments, ...rest }) => ({ ...rest, fg: rest.og - ferments * (rest.og - 0.99) }));
type Beer = typeof beer extends fc.Arbitrary<infer T> ? T : never;

/** Nothing, or what some instrument could tell from nothing: the rest is rounding of tiny numbers. */
const amount = (least: number, most: number) => fc.oneof(fc.constant(0), between(least, most));
const measuredCake = fc.record(
  {
    volumeL: amount(1e-6, 100),
    massKg: amount(1e-6, 100),
    viability: amount(1e-6, 1),
    cellsPerMl: amount(1, 5e9),
  },
  { requiredKeys: [] },
);

test('a blend lies between its parts', () => {
  fc.assert(
    fc.property(between(0.5, 5000), between(0, 200), between(0, 100), between(0, 200), (...v) => {
      const [vB, xB, vR, xA] = v;
      const mixed = blend(vB, xB, vR, xA);
      expect(mixed).toBeGreaterThanOrEqual(Math.min(xA, xB) - 1e-9);
      expect(mixed).toBeLessThanOrEqual(Math.max(xA, xB) + 1e-9);
    }),
  );
});

test('keeping less never moves the blend further', () => {
  const part = between(0, 1);
  const litres = between(0.01, 50);
  fc.assert(
    fc.property(litres, part, part, between(0, 20), between(0, 100), between(0, 100), (...v) => {
      const [cakeL, one, other, leftAboveL, xA, xB] = v;
      const shift = (share: number) =>
        Math.abs(
          blend(20, xB, retainedBeerL({ keptL: share * cakeL, cakeL, leftAboveL }), xA) - xB,
        );
      expect(shift(Math.min(one, other))).toBeLessThanOrEqual(shift(Math.max(one, other)) + 1e-9);
    }),
  );
});

test('intervals are in order, whatever is known of the cake', () => {
  fc.assert(
    fc.property(beer, measuredCake, (facts, measured) => {
      const cake = estimateCake({ ...facts, measured });
      for (const { low, likely, high } of [
        cake.settledCells,
        cake.viableCells,
        cake.volumeL,
        cake.massKg,
      ]) {
        expect(low).toBeGreaterThanOrEqual(0);
        expect(low).toBeLessThanOrEqual(likely);
        expect(likely).toBeLessThanOrEqual(high);
        expect(Number.isFinite(high)).toBe(true);
      }
    }),
  );
});

test('measuring never widens the interval of the living cells', () => {
  fc.assert(
    fc.property(beer, measuredCake, (facts, measured) => {
      const guessed = estimateCake(facts).viableCells;
      const known = estimateCake({ ...facts, measured }).viableCells;
      fc.pre(guessed.likely > 0 && known.likely > 0);
      expect(known.low / known.likely).toBeGreaterThanOrEqual(guessed.low / guessed.likely - 1e-9);
      expect(known.high / known.likely).toBeLessThanOrEqual(guessed.high / guessed.likely + 1e-9);
    }),
  );
});

test('the cake grows with the batch', () => {
  fc.assert(
    fc.property(beer, between(0.1, 10), (facts: Beer, by) => {
      const one = estimateCake(facts);
      const scaled = estimateCake({ ...facts, volumeL: facts.volumeL * by });
      expect(scaled.viableCells.low).toBeCloseTo(one.viableCells.low * by, -4);
      expect(scaled.volumeL.likely / Math.max(1e-12, one.volumeL.likely * by)).toBeCloseTo(
        one.volumeL.likely > 0 ? 1 : 0,
        9,
      );
    }),
  );
});

test('the recommended part meets the need at the low end, or is all there is', () => {
  fc.assert(
    fc.property(beer, between(1, 1e14), (facts, need) => {
      const cake = estimateCake(facts);
      const { share, meetsNeed, litres } = recommendedKeep({ cake, need });
      expect(litres).toBeLessThanOrEqual(cake.volumeL.likely);
      const low = share * cake.viableCells.low;
      expect(meetsNeed ? low >= need * (1 - 1e-12) : share === 1 && low < need).toBe(true);
    }),
  );
});
