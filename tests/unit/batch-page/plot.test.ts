import { describe, expect, test } from 'vitest';
import { axisOf, dayTicks } from '../../../src/routes/batch/plot/axes.ts';
import { thinned } from '../../../src/routes/batch/plot/thin.ts';

describe('thousands of points draw the same line', () => {
  const many = Array.from({ length: 5000 }, (_, at) => ({
    day: at / 100,
    value: at === 3210 ? 40 : at === 777 ? 2 : 19,
  }));
  test('with few of them, ends and extremes kept, in order', () => {
    const few = thinned(many);
    expect(few.length).toBeLessThanOrEqual(400);
    expect([few[0]?.day, few.at(-1)?.day]).toEqual([0, 49.99]);
    const values = few.map(({ value }) => value);
    expect([Math.min(...values), Math.max(...values)]).toEqual([2, 40]);
    expect(few.map(({ day }) => day)).toEqual(few.map(({ day }) => day).toSorted((a, b) => a - b));
  });
  test('few stay as they are', () => {
    const few = many.slice(0, 20);
    expect(thinned(few)).toBe(few);
  });
});

test('a gravity axis ends on round figures around the values', () => {
  const axis = axisOf([1.011, 1.0505], 0.01, 0.02);
  expect(axis.low).toBeCloseTo(1.01, 9);
  expect(axis.high).toBeCloseTo(1.06, 9);
  expect(axis.ticks.map((tick) => tick.toFixed(2))).toEqual([
    '1.01',
    '1.02',
    '1.03',
    '1.04',
    '1.05',
    '1.06',
  ]);
});

test('one value still has a scale', () => {
  const axis = axisOf([19], 2, 6);
  expect(axis.high - axis.low).toBeGreaterThanOrEqual(6);
});

test.each([
  [14, 8, [0, 2, 4, 6, 8, 10, 12, 14]],
  [7, 4, [0, 2, 4, 6]],
  [400, 8, [0, 56, 112, 168, 224, 280, 336, 392]],
])('%d days have at most %d ticks or so', (days, most, ticks) =>
  expect(dayTicks(days, most)).toEqual(ticks),
);
