import { describe, expect, it } from 'vitest';
import {
  labelSide,
  ratioScaleOf,
  scaleOf,
  strokesOf,
} from '../../../src/routes/chain/plots/scales.ts';

const LANE = { top: 20, bottom: 100, least: 0 };

describe('a lane’s scale', () => {
  it('puts the largest value at the top and the smallest at the foot', () => {
    const at = scaleOf([4, 7, 10], LANE);
    expect([at(10), at(7), at(4)]).toEqual([20, 60, 100]);
  });

  it('does not blow a small difference up', () => {
    const at = scaleOf([5, 6], { ...LANE, least: 4 });
    expect([at(5.5), at(5) - at(6)]).toEqual([60, 20]);
  });

  it('draws one value, or none, in the middle', () => {
    expect(scaleOf([7], { ...LANE, least: 1 })(7)).toBe(60);
    expect(scaleOf([null, null], LANE)(3)).toBe(60);
  });

  it('leaves out what is not known', () => {
    expect(scaleOf([null, 4, 10, null], LANE)(10)).toBe(20);
  });
});

describe('a scale of multiples', () => {
  it('has half and twice equally far from one', () => {
    const at = ratioScaleOf([0.5, 2], LANE);
    expect([at(0.5), at(1), at(2)]).toEqual([100, 60, 20]);
  });

  it('puts nothing at all on the floor', () => {
    expect(ratioScaleOf([0, 1, 2], LANE)(0)).toBe(100);
  });
});

it('writes a label where the line does not go', () => {
  const values = [4, 7, 5, null, 3];
  expect(values.map((_, place) => labelSide(values, place))).toEqual([
    'below',
    'above',
    'above',
    'above',
    'above',
  ]);
});

it('draws no line through what is not known', () => {
  expect(strokesOf([1, 2, null, 3, 4])).toEqual([
    { fromPlace: 0, toPlace: 1 },
    { fromPlace: 3, toPlace: 4 },
  ]);
  expect(strokesOf([1])).toEqual([]);
});
