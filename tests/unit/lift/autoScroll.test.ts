import { describe, expect, it } from 'vitest';
import { scrollStep } from '../../../src/routes/board/lift/autoScroll.ts';

describe('scrolling near an edge', () => {
  it.each([
    [500, 0],
    [56, 0],
    [944, 0],
    [28, -9],
    [0, -18],
    [-40, -18],
    [972, 9],
    [1000, 18],
    [1200, 18],
  ])('at %i of 1000 goes by %i', (at, step) => {
    expect(scrollStep(at, 0, 1000)).toBeCloseTo(step, 10);
  });

  it('leaves half of a narrow shelf at rest', () => {
    expect(scrollStep(30, 0, 100)).toBe(0);
    expect(scrollStep(50, 0, 100)).toBe(0);
    expect(scrollStep(80, 0, 100)).toBeGreaterThan(0);
  });
});
