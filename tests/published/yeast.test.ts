import { describe, expect, test } from 'vitest';
import { estimateCake } from '#shared/cake/estimate.ts';
import { thumbKg } from '#shared/cake/keep.ts';
import { sgFromPlato } from '#shared/units/gravity.ts';
import { growthPerMl, YIELD_PER_ML_PLATO } from '#shared/yeast/growth.ts';
import { pitchNeed } from '#shared/yeast/pitching.ts';

const og12 = sgFromPlato(12);
const fg2 = sgFromPlato(2.5);

test('growth: (152 − 100)/7 million cells per mL and °P, White & Zainasheff 2010 (looked up)', () => {
  expect(Math.abs(YIELD_PER_ML_PLATO - 7.4e6)).toBeLessThan(0.5e6);
});

test('peak count near 80e6 per mL in all-malt wort, Boulton & Quain 2001 (looked up)', () => {
  // The gravity is not given: 12 to 2.5 °P from 10e6 cells per mL stands for a usual brew.
  expect(Math.abs(10e6 + growthPerMl(og12, fg2) - 80e6)).toBeLessThanOrEqual(20e6);
});

test('one crop serves two or more fermentations, Boulton & Quain 2001, 7.2 (looked up)', () => {
  const cake = estimateCake({ volumeL: 20, og: og12, fg: fg2, kind: 'ale', survival: 1 });
  const nextPitch = 1e6 * 12 * 20_000;
  expect(cake.viableCells.likely / nextPitch).toBeGreaterThanOrEqual(2);
  expect(cake.viableCells.low / nextPitch).toBeGreaterThanOrEqual(2);
});

test('crops get smaller as gravity rises from 12 to 23 °P, Suihko et al. 1993 (looked up)', () => {
  const perPlato = (plato: number) =>
    growthPerMl(sgFromPlato(plato), sgFromPlato(plato / 4)) / plato;
  expect(perPlato(23)).toBeLessThan(perPlato(12));
});

test.each([
  ['ale', 0.75e6],
  ['lager', 1.5e6],
] as const)('%s: pitching rate per mL and °P, Fix 1997 (second-hand)', (kind, rate) => {
  const need = pitchNeed({ volumeL: 1, og: og12, kind });
  expect(need / 1000 / 12).toBeCloseTo(rate, 0);
});

test('strong worts: 2.9 in place of 2.3e6 per mL and °P, Suihko et al. 1993 (looked up)', () => {
  const rate = (plato: number) =>
    pitchNeed({ volumeL: 1, og: sgFromPlato(plato), kind: 'ale' }) / plato;
  expect(Math.abs(rate(21) / rate(14) - 2.9 / 2.3)).toBeLessThan(0.02);
});

test('23 L take about 230 to 390 g of slurry: the trade’s rule of thumb (common practice)', () => {
  const { low, high } = thumbKg({ volumeL: 23, og: 1.05, kind: 'ale' });
  expect(low).toBeCloseTo(0.23, 2);
  expect(high).toBeCloseTo(0.39, 2);
});

describe('in-sample: values that the estimate was chosen from', () => {
  test('harvested slurry of 1.2e9 cells per mL (second-hand), clean slurry up to 3.1e9', () => {
    const cake = estimateCake({
      volumeL: 20,
      og: og12,
      fg: fg2,
      kind: 'ale',
      survival: 1,
      trub: 'little',
    });
    const perMl = cake.settledCells.likely / (cake.volumeL.likely * 1000) / 0.9;
    // 40 % wet solids (Quain) at 7.67e9 cells per g (Suihko et al. 1993) bound it from above.
    expect(perMl).toBeGreaterThanOrEqual(1.2e9 * 0.999);
    expect(perMl).toBeLessThan(0.4 * 7.67e9);
  });
});
