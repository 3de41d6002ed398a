import { describe, expect, test } from 'vitest';
import { relativeAbsorbance, WHITE } from '#shared/units/beerSpectrum.ts';
import { ebcFromSrm, srmFromAbsorbance, srmFromEbc } from '#shared/units/colour.ts';
import { observer } from '#shared/units/observer.ts';
import { srgb } from '#shared/units/srgb.ts';

test('absorbance 2.0 in 1 cm is 25.4 SRM: ASBC MOA Beer-10 (looked up)', () => {
  expect(srmFromAbsorbance(2)).toBeCloseTo(25.4, 9);
});

test('EBC is 1.97 (1.9685) times SRM: EBC Analytica 9.6 (looked up)', () => {
  expect(ebcFromSrm(1)).toBeCloseTo(1.9685, 4);
  expect(srmFromEbc(1.9685)).toBeCloseTo(1, 4);
});

describe('average beer spectrum', () => {
  test('is absorbance per absorbance at 430 nm: 1 there, by definition', () => {
    expect(relativeAbsorbance(430)).toBeCloseTo(1, 9);
  });
  test('passes the turbidity test A700/A430 ≤ 0.039, ASBC Beer-10A (limit looked up)', () => {
    expect(relativeAbsorbance(700)).toBeLessThanOrEqual(0.039);
    expect(relativeAbsorbance(700)).toBeGreaterThan(0);
  });
});

describe('CIE 1931 2° observer, table values within 0.014 (looked up)', () => {
  test.each([
    [440, 0.3483, 0.023, 1.7471],
    [520, 0.0633, 0.71, 0.0782],
  ] as const)('%d nm', (nm, x, y, z) => {
    const [fitX, fitY, fitZ] = observer(nm);
    expect(Math.abs(fitX - x)).toBeLessThanOrEqual(0.014);
    expect(Math.abs(fitY - y)).toBeLessThanOrEqual(0.014);
    expect(Math.abs(fitZ - z)).toBeLessThanOrEqual(0.014);
  });
});

const chromaticity = ([x, y, z]: readonly [number, number, number]) => [
  x / (x + y + z),
  y / (x + y + z),
];

test('white of D65 falls at 0.3127, 0.3290: CIE 15 (looked up)', () => {
  const [x = 0, y = 0] = chromaticity(WHITE);
  expect(Math.abs(x - 0.3127)).toBeLessThanOrEqual(3e-4);
  expect(Math.abs(y - 0.329)).toBeLessThanOrEqual(3e-4);
});

test('the observer puts illuminant C at 0.3101, 0.3162: CIE 15 (from memory)', () => {
  // Relative power of illuminant C, 380 to 780 nm every 10 nm (CIE 15, from memory).
  const C = [
    33, 47.4, 63.3, 80.6, 98.1, 112.4, 121.5, 124, 123.1, 123.8, 123.9, 120.7, 112.1, 102.3, 96.9,
    98, 102.1, 105.2, 105.3, 102.3, 97.8, 93.2, 89.7, 88.4, 88.1, 88, 87.8, 88.2, 87.9, 86.3, 84,
    80.2, 76.3, 72.4, 68.3, 64.4, 61.5, 59.2, 58.1, 58, 59.1,
  ];
  const sum: [number, number, number] = [0, 0, 0];
  C.forEach((power, i) => {
    const [x, y, z] = observer(380 + 10 * i);
    sum[0] += power * x;
    sum[1] += power * y;
    sum[2] += power * z;
  });
  const [x = 0, y = 0] = chromaticity(sum);
  expect(Math.abs(x - 0.3101)).toBeLessThanOrEqual(4e-4);
  expect(Math.abs(y - 0.3162)).toBeLessThanOrEqual(4e-4);
});

describe('sRGB, IEC 61966-2-1 (from memory)', () => {
  test('white', () => expect(srgb([95.047, 100, 108.883])).toEqual([255, 255, 255]));
  test('red', () => expect(srgb([41.246, 21.267, 1.933])).toEqual([255, 0, 0]));
});
