import { describe, expect, test } from 'vitest';
import {
  cellsPerMl,
  cellsPerMlOfFields,
  countError,
  MEBAK_DEAD,
  scatter,
  viability,
  viabilityInterval,
} from '#shared/yeast/counting.ts';

/** Worked example of a discussion of the MBAA community, "Cell count error" (looked up). */
const FIELDS = [35, 41, 37, 47, 43, 45, 70, 46, 40, 29];

test('ten fields of 0.0625 mm² average to 6.93e6 cells per mL', () => {
  expect(Math.abs(cellsPerMlOfFields(FIELDS, 0.0625, 1) - 6.93e6)).toBeLessThanOrEqual(1e4);
});

test('and scatter by 25 %', () => {
  expect(Math.abs(scatter(FIELDS) * 100 - 25)).toBeLessThanOrEqual(0.5);
});

test('all 25 squares are 1e-4 mL: count × 1e4 × dilution, ASBC MOA Yeast-4 (looked up)', () => {
  expect(cellsPerMl(250, 25, 100)).toBe(2.5e8);
  expect(cellsPerMl(50, 5, 100)).toBe(2.5e8);
});

test.each([
  [100, 0.1],
  [400, 0.05],
])('a count of %d errs by %d by chance alone: Poisson, by definition', (count, error) => {
  expect(countError(count)).toBeCloseTo(error, 12);
});

describe('Wilson score intervals of Newcombe 1998, Stat. Med. 17:857–872, Table I (from memory)', () => {
  test.each([
    [81, 263, 0.2553, 0.3662],
    [15, 148, 0.0624, 0.1605],
    [0, 20, 0, 0.1611],
    [1, 29, 0.0061, 0.1718],
  ])('%d of %d', (found, of, low, high) => {
    const interval = viabilityInterval(found, of - found);
    expect(interval.low).toBeCloseTo(low, 4);
    expect(interval.high).toBeCloseTo(high, 4);
  });
  test('380 living of 400', () => expect(viability(380, 20)).toBe(0.95));
});

test('MEBAK M-350.18.518: dead cells below 2 %, excluded from 5 % (looked up)', () => {
  expect(MEBAK_DEAD).toEqual({ target: 0.02, exclude: 0.05 });
});
