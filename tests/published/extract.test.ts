import { describe, expect, test } from 'vitest';
import { platoFromSg, sgFromPlato } from '#shared/units/gravity.ts';

describe('Asadi, Beet-Sugar Handbook, Wiley 2007, Table A.1 (looked up)', () => {
  // °P, then relative density 20/20 in vacuum. The 5 % row of the table is a density in kg/m³ and
  // left out. In air: SG = 1 + (d − 1) × 1.0012036 (air of 1.2 kg/m³).
  const ROWS = [
    [2, 1.00779],
    [4, 1.01567],
    [6, 1.02366],
    [8, 1.03176],
    [10, 1.03998],
    [12, 1.04831],
    [14, 1.05677],
    [15, 1.06104],
    [17, 1.06968],
    [18, 1.07404],
    [20, 1.08287],
    [21, 1.08733],
  ] as const;
  const inAir = (d: number) => 1 + (d - 1) * 1.0012036;

  test.each(ROWS)('%d °P: SG within 0.00005', (plato, d) => {
    expect(Math.abs(sgFromPlato(plato) - inAir(d))).toBeLessThanOrEqual(5e-5);
  });
  test.each(ROWS)('%d °P from its SG, within 0.005 °P', (plato, d) => {
    expect(Math.abs(platoFromSg(inAir(d)) - plato)).toBeLessThanOrEqual(0.005);
  });
  test('water has no extract', () => {
    expect(platoFromSg(1)).toBe(0);
    expect(sgFromPlato(0)).toBe(1);
  });
});

describe('the same table, in-air SG rounded to its five digits (looked up)', () => {
  const ROWS = [
    [2, 1.0078],
    [8, 1.0318],
    [10, 1.04003],
    [12, 1.04837],
    [15, 1.06111],
    [17, 1.06976],
    [18, 1.07413],
    [20, 1.08297],
  ] as const;
  test.each(ROWS)('%d °P is SG %d', (plato, sg) => {
    expect(Math.abs(sgFromPlato(plato) - sg)).toBeLessThanOrEqual(5e-5);
    expect(Math.abs(platoFromSg(sg) - plato)).toBeLessThanOrEqual(0.005);
  });
});

describe('USDA Sucrose Conversion Table, File Code 135-A-50, apparent SG 20/20 (looked up)', () => {
  const ROWS = [
    [0.1, 1.00039],
    [0.3, 1.00117],
    [3.8, 1.0149],
    [3.9, 1.01529],
    [4, 1.01569],
    [4.1, 1.01609],
    [7.6, 1.03017],
    [7.7, 1.03058],
    [7.8, 1.03098],
    [7.9, 1.03139],
  ] as const;
  test.each(ROWS)('%d °P is SG %d within 0.00003', (plato, sg) => {
    expect(Math.abs(sgFromPlato(plato) - sg)).toBeLessThanOrEqual(3e-5);
  });
});

test('one-parameter form of Buhl 2024, stated to 0.023 °P RMS (looked up)', () => {
  const differences = Array.from({ length: 200 }, (_, i) => {
    const sg = 1 + (i + 1) / 2500;
    return platoFromSg(sg) - 260.4 * (1 - 1 / sg);
  });
  const rms = Math.sqrt(differences.reduce((sum, d) => sum + d * d, 0) / differences.length);
  expect(rms).toBeLessThan(0.023);
});
