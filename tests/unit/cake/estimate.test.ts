import { describe, expect, test } from 'vitest';
import { estimateCake } from '#shared/cake/estimate.ts';
import { recommendedKeep, thumbKg } from '#shared/cake/keep.ts';
import { sgFromPlato } from '#shared/units/gravity.ts';

const og = sgFromPlato(12);
const fg = sgFromPlato(2.5);
const beer = { volumeL: 20, og, fg, kind: 'ale', survival: 1 } as const;
const estimate = estimateCake(beer);

const relative = ({ low, likely, high }: { low: number; likely: number; high: number }) => ({
  low: low / likely,
  high: high / likely,
});

describe('by growth', () => {
  test('pitched and grown cells, worked by hand', () => {
    // 0.75e6 × 12 × 20,000 = 1.8e11 pitched; 7e6 × 9.5 × 20,000 = 1.33e12 grown.
    expect(estimate.settledCells.likely / 1e12).toBeCloseTo(0.9 * 1.51, 3);
    expect(estimate.viableCells.likely / 1e12).toBeCloseTo(0.92 * 0.9 * 1.51, 3);
    expect(estimate.settledCells.low / 1e12).toBeCloseTo(0.9 * (0.18 + 1.33 / 1.8), 3);
    expect(estimate.settledCells.high / 1e12).toBeCloseTo(0.9 * (0.18 + 1.33 * 1.8), 3);
    expect(estimate.volumeL.likely).toBeCloseTo(1.359 / 1.2 / 0.8, 3);
    expect(estimate.massKg.likely).toBeCloseTo((1.05 * 1.359) / 1.2 / 0.8, 3);
    expect(estimate.measured).toBe(false);
  });

  test('the wait takes its part of the living cells only', () => {
    const waited = estimateCake({ ...beer, survival: 0.5 });
    expect(waited.viableCells.likely).toBeCloseTo(estimate.viableCells.likely / 2, 0);
    expect(waited.volumeL).toEqual(estimate.volumeL);
  });

  test('trub takes room and holds no cells', () => {
    const much = estimateCake({ ...beer, trub: 'much' });
    expect(much.settledCells).toEqual(estimate.settledCells);
    expect(much.volumeL.likely / estimate.volumeL.likely).toBeCloseTo(0.8 / 0.6, 9);
  });
});

describe('measured', () => {
  const measured = (facts: NonNullable<Parameters<typeof estimateCake>[0]['measured']>) =>
    estimateCake({ ...beer, measured: facts });

  test('a volume gives the cells that fit in it', () => {
    const cake = measured({ volumeL: 1 });
    expect(cake.volumeL.likely).toBe(1);
    expect(cake.settledCells.likely).toBeCloseTo(1.2e12 * 0.8, 0);
    expect(cake.massKg.likely).toBeCloseTo(1.05, 12);
  });

  test('a mass gives the volume; both stand as they were read', () => {
    expect(measured({ massKg: 1.05 }).volumeL.likely).toBeCloseTo(1, 12);
    const both = measured({ massKg: 1.2, volumeL: 1 });
    expect([both.massKg.likely, both.volumeL.likely]).toEqual([1.2, 1]);
  });

  test('a count replaces the usual density; with a volume it gives the cells', () => {
    const counted = measured({ cellsPerMl: 0.5e9 });
    expect(counted.settledCells.likely / estimate.settledCells.likely).toBeCloseTo(1, 12);
    expect(counted.volumeL.likely).toBeCloseTo(1.359e12 / 0.5e12, 2);
    expect(measured({ cellsPerMl: 0.5e9, volumeL: 2 }).settledCells.likely).toBe(1e12);
  });

  test('a cake is never larger than its batch, however thin it was counted', () => {
    const thin = measured({ cellsPerMl: 1e6 });
    expect(thin.volumeL.likely).toBe(20);
    expect(thin.settledCells.likely).toBeCloseTo(20 * 1e9, 0);
  });

  test('a living share replaces the usual one', () => {
    const cake = measured({ viability: 0.5 });
    expect(cake.viableCells.likely / cake.settledCells.likely).toBeCloseTo(0.5, 12);
  });

  test.each([
    { volumeL: 1 },
    { massKg: 1 },
    { viability: 0.95 },
    { volumeL: 1, cellsPerMl: 1e9 },
    { volumeL: 1, cellsPerMl: 1e9, viability: 0.9 },
  ])('%o narrows the interval of living cells', (facts) => {
    const cake = measured(facts);
    expect(cake.measured).toBe(true);
    expect(relative(cake.viableCells).low).toBeGreaterThan(relative(estimate.viableCells).low);
    expect(relative(cake.viableCells).high).toBeLessThan(relative(estimate.viableCells).high);
  });

  test('an empty cake holds nothing', () => {
    const none = measured({ volumeL: 0 });
    expect(none.viableCells).toEqual({ low: 0, likely: 0, high: 0 });
    expect(measured({ cellsPerMl: 0 }).viableCells).toEqual({ low: 0, likely: 0, high: 0 });
  });
});

describe('how much to keep', () => {
  test('the low end of the recommended part is the need', () => {
    const kept = recommendedKeep({ cake: estimate, need: 2e11 });
    expect(kept.share * estimate.viableCells.low).toBeCloseTo(2e11, 0);
    expect(kept.litres / estimate.volumeL.likely).toBeCloseTo(kept.share, 12);
    expect(kept.kg / estimate.massKg.likely).toBeCloseTo(kept.share, 12);
    expect(kept.meetsNeed).toBe(true);
  });
  test('all of it where it falls short', () => {
    const kept = recommendedKeep({ cake: estimate, need: 1e13 });
    expect(kept).toMatchObject({ share: 1, litres: estimate.volumeL.likely, meetsNeed: false });
  });
  test('nothing where nothing is needed', () => {
    expect(recommendedKeep({ cake: estimate, need: 0 }).litres).toBe(0);
  });
  test('by rule of thumb, more above 1.070 and double for lagers', () => {
    expect(thumbKg({ volumeL: 10, og: 1.07, kind: 'ale' }).low).toBeCloseTo(0.1, 12);
    expect(thumbKg({ volumeL: 10, og: 1.0702, kind: 'ale' }).high).toBeCloseTo(0.27, 12);
    expect(thumbKg({ volumeL: 10, og: 1.05, kind: 'lager' }).high).toBeCloseTo(0.34, 12);
  });
});
