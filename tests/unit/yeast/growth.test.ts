import { expect, test } from 'vitest';
import { sgFromPlato } from '#shared/units/gravity.ts';
import { growthPerMl, yieldShare } from '#shared/yeast/growth.ts';
import { pitchNeed } from '#shared/yeast/pitching.ts';
import { survival } from '#shared/yeast/storage.ts';

test('the yield tapers from 16 °P, linear between its points', () => {
  expect([0, 12, 16].map(yieldShare)).toEqual([1, 1, 1]);
  expect(yieldShare(17)).toBeCloseTo(0.925, 12);
  expect(yieldShare(18)).toBeCloseTo(0.85, 12);
  expect(yieldShare(20)).toBeCloseTo(0.775, 12);
  expect(yieldShare(22)).toBeCloseTo(0.7, 12);
  expect(yieldShare(25)).toBeCloseTo(0.6, 12);
  expect(yieldShare(40)).toBe(0.6);
});

test('nothing grows where nothing ferments', () => {
  expect(growthPerMl(1.05, 1.05)).toBe(0);
  expect(growthPerMl(1.05, 1.06)).toBe(0);
  expect(growthPerMl(1.05, 0.998)).toBeGreaterThan(growthPerMl(1.05, 1));
});

test('the need rises by a quarter at 1.074, and lagers need twice what ales do', () => {
  const ale = (og: number) => pitchNeed({ volumeL: 20, og, kind: 'ale' });
  expect(ale(1.074) / ale(1.0739)).toBeGreaterThan(1.24);
  expect(ale(1.074) / ale(1.0739)).toBeLessThan(1.26);
  expect(pitchNeed({ volumeL: 20, og: 1.05, kind: 'lager' })).toBe(2 * ale(1.05));
  expect(ale(sgFromPlato(12))).toBeCloseTo(1.8e11, -3);
  expect(ale(1)).toBe(0);
});

test('a wait before the yeast is taken costs nothing', () => {
  expect(survival(0, 20)).toBe(1);
  expect(survival(-3, 20)).toBe(1);
  expect(survival(2, 20)).toBeLessThan(survival(2, 4));
});
