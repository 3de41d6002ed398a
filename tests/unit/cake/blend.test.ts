import { expect, test } from 'vitest';
import { blend, retainedBeerL } from '#shared/cake/blend.ts';

test('colour and bitterness mix by volume, worked by hand', () => {
  expect(blend(20, 3, 0.5, 40)).toBeCloseTo(80 / 20.5, 12);
  expect(blend(20, 20, 0.5, 70)).toBeCloseTo(435 / 20.5, 12);
  expect(blend(0, 7, 0, 40)).toBe(7);
});

test('half of the kept cake is beer, and the beer above goes over in proportion', () => {
  expect(retainedBeerL({ keptL: 0.4, cakeL: 1.6, leftAboveL: 0.46 })).toBeCloseTo(0.315, 12);
  expect(retainedBeerL({ keptL: 5, cakeL: 1.6, leftAboveL: 0.46 })).toBeCloseTo(1.26, 12);
  expect(retainedBeerL({ keptL: 0, cakeL: 1.6, leftAboveL: 0.46 })).toBe(0);
  expect(retainedBeerL({ keptL: 1, cakeL: 0, leftAboveL: 0.46 })).toBe(0);
});
