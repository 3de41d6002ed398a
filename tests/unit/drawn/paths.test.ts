import { describe, expect, it } from 'vitest';
import { VESSEL_SHAPES } from '#shared/api/vessel.ts';
import { sideEdge, topEdge, tornClip } from '../../../src/components/drawn/bandPath.ts';
import { beerTop, cakeTop, outlineWidth } from '../../../src/components/drawn/silhouettes.ts';

/** Where a path of relative quadratic curves ends, from its start. */
function endOf(path: string): [number, number] {
  const curves = [...path.matchAll(/q(\S+) (\S+) (\S+) (\S+)/g)];
  return [
    curves.reduce((sum, curve) => sum + Number(curve[3]), 0),
    curves.reduce((sum, curve) => sum + Number(curve[4]), 0),
  ];
}

describe('the cake on its way', () => {
  it.each([44, 219, 246, 1000])('runs %i px along the shelf, level', (width) => {
    const [x, y] = endOf(topEdge(width));
    expect(x).toBeCloseTo(width, 6);
    expect(y).toBe(0);
  });

  it.each([12, 82, 320])('runs %i px down the page, plumb', (height) => {
    const [x, y] = endOf(sideEdge(height));
    expect(x).toBe(0);
    expect(y).toBeCloseTo(height, 6);
  });

  it('is torn so that the two parts never touch', () => {
    const xs = (part: string) => [...part.matchAll(/[HL](-?[\d.]+)/g)].map((m) => Number(m[1]));
    const [left = '', right = ''] = tornClip(219).split('ZM');
    const leftMost = Math.max(...xs(left));
    const rightMost = Math.min(...xs(right).filter((x) => x < 219));
    expect(leftMost).toBeLessThan(rightMost);
  });
});

describe('what stands in a vessel', () => {
  it('fills from the foot at 129 to the brim at 22', () => {
    expect(beerTop(0.5)).toBeCloseTo((129 + 22) / 2, 10);
    expect(beerTop(0.8)).toBeLessThan(beerTop(0.5));
  });

  it('never spills over and never runs dry', () => {
    expect(beerTop(7)).toBeGreaterThan(22);
    expect(beerTop(-1)).toBeLessThan(129);
  });

  it.each(VESSEL_SHAPES)('shows a cake in a %s, higher for a larger share', (shape) => {
    expect(cakeTop(shape, 0)).toBeLessThan(129);
    expect(cakeTop(shape, 0.1)).toBeLessThan(cakeTop(shape, 0.02));
    expect(cakeTop(shape, 5)).toBeGreaterThan(60);
  });

  it('keeps an outline of about 2.2 px at the sizes of the board', () => {
    for (const width of [70, 78, 104])
      expect((outlineWidth(width) * width) / 84).toBeCloseTo(2.15, 2);
  });
});
