import { converter, differenceCiede2000 } from 'culori';
import { describe, expect, test } from 'vitest';
import { beerXyz } from '#shared/units/beerSpectrum.ts';
import { beerLab, beerRgb, blackOrWhiteOn } from '#shared/units/colour.ts';
import { D65 } from '#shared/units/daylight.ts';
import { deltaE00 } from '#shared/units/deltaE.ts';
import { srgb } from '#shared/units/srgb.ts';

const SRMS = [0, 0.5, 2, 3, 4, 6, 10, 15, 20, 30, 40, 60, 100];

test('every second value of daylight lies midway between its neighbours, as CIE defines it', () => {
  expect(D65).toHaveLength(81);
  for (let i = 1; i < D65.length; i += 2) {
    const middle = ((D65[i - 1] ?? 0) + (D65[i + 1] ?? 0)) / 2;
    expect(Math.abs((D65[i] ?? 0) - middle)).toBeLessThan(0.001);
  }
});

describe('against culori, an independent colour library', () => {
  const rgbOf = converter('rgb');
  const labOf = converter('lab65');
  const difference = differenceCiede2000();

  test.each(SRMS)('sRGB of %d SRM in 5 cm, within 1 of 255', (srm) => {
    const [x, y, z] = beerXyz(srm * 5);
    const theirs = rgbOf({ mode: 'xyz65', x: x / 100, y: y / 100, z: z / 100 });
    const clip = (c: number) => 255 * Math.min(1, Math.max(0, c));
    const [r, g, b] = srgb([x, y, z]);
    expect(Math.abs(r - clip(theirs.r))).toBeLessThan(1);
    expect(Math.abs(g - clip(theirs.g))).toBeLessThan(1);
    expect(Math.abs(b - clip(theirs.b))).toBeLessThan(1);
  });

  test.each(SRMS)('L*a*b* of %d SRM in 5 cm, within 0.2 (our white is of our sums)', (srm) => {
    const [x, y, z] = beerXyz(srm * 5);
    const theirs = labOf({ mode: 'xyz65', x: x / 100, y: y / 100, z: z / 100 });
    const [l, a, b] = beerLab(srm, 5);
    expect(Math.abs(l - theirs.l)).toBeLessThan(0.2);
    expect(Math.abs(a - theirs.a)).toBeLessThan(0.2);
    expect(Math.abs(b - theirs.b)).toBeLessThan(0.2);
  });

  test('CIEDE2000 of every pair of these beers', () => {
    for (const one of SRMS)
      for (const other of SRMS) {
        const [lab1, lab2] = [beerLab(one, 5), beerLab(other, 5)];
        const [p, q] = [lab1, lab2].map(([l, a, b]) => ({ mode: 'lab65' as const, l, a, b }));
        expect(p && q && Math.abs(deltaE00(lab1, lab2) - difference(p, q))).toBeLessThan(1e-9);
      }
  });
});

test('more beer is darker, and an empty glass is white', () => {
  const lightness = SRMS.map((srm) => beerLab(srm, 5)[0]);
  expect(lightness).toEqual([...lightness].sort((a, b) => b - a));
  expect(new Set(lightness).size).toBe(SRMS.length);
  expect(lightness[0]).toBeCloseTo(100, 9);
  expect(beerRgb(0, 5)).toBe('rgb(255 255 255)');
  expect(beerRgb(-3, 5)).toBe('rgb(255 255 255)');
});

test('only SRM × path counts', () => {
  expect(beerLab(2, 5)).toEqual(beerLab(10, 1));
  expect(beerRgb(2, 5)).toBe(beerRgb(10, 1));
});

test('text on a pale beer is black, on a stout white', () => {
  expect(blackOrWhiteOn(3, 5)).toBe('black');
  expect(blackOrWhiteOn(40, 5)).toBe('white');
});
