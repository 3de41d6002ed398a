import { describe, expect, test } from 'vitest';
import { forecast } from '#shared/pour/forecast.ts';
import { chance, minutes, read, trueTime, type Cooling } from '../../support/cooling.ts';

const WINDOW = { minC: 18, maxC: 22 };
const RUNS = 1000;

function run(
  of: (next: () => number) => { cooling: Cooling; coolantC?: number; every: number; count: number },
) {
  let inside = 0;
  let told = 0;
  const widths: number[] = [];
  for (let seed = 1; seed <= RUNS; seed += 1) {
    const next = chance(seed * 7919);
    const { cooling, coolantC, every, count } = of(next);
    const readings = read(cooling, next, every, count);
    const { ready } = forecast({ readings, window: WINDOW, coolantC });
    if (!ready) continue;
    told += 1;
    const at = minutes(trueTime(cooling, WINDOW.maxC));
    if (ready.earliest <= at && at <= ready.latest) inside += 1;
    widths.push((ready.latest - ready.earliest) / 60_000);
  }
  widths.sort((a, b) => a - b);
  return { share: inside / told, told, median: widths[Math.floor(told / 2)] ?? Number.NaN };
}

/** 20 L in a bath at room temperature: 35 °C falls to 22 °C in 78 minutes. */
const BATH: Cooling = { from: 35, towards: 16, tau: 68 };

describe('1,000 coolings with readings to ±0.3 °C', () => {
  test('20 L from 35 °C in a room of 16 °C, a reading every 10 minutes over an hour', () => {
    const found = run(() => ({ cooling: BATH, coolantC: 16, every: 10, count: 7 }));
    expect(found.told).toBe(RUNS);
    expect(found.share).toBeGreaterThanOrEqual(0.86);
    expect(found.share).toBeLessThanOrEqual(0.94);
    expect(found.median).toBeLessThanOrEqual(30);
  });

  test('the same without knowing the room', () => {
    const found = run(() => ({ cooling: BATH, every: 10, count: 7 }));
    expect(found.told).toBeGreaterThan(0.97 * RUNS);
    expect(found.share).toBeGreaterThanOrEqual(0.86);
    expect(found.share).toBeLessThanOrEqual(0.94);
    expect(found.median).toBeLessThanOrEqual(30);
  });

  test('all sorts: from 28 to 60 °C, towards 5 to 18 °C, quick and slow', () => {
    const found = run((next) => {
      const cooling = { from: 28 + 32 * next(), towards: 5 + 13 * next(), tau: 20 + 80 * next() };
      // The last reading lies between half and nine tenths of the way.
      const until = trueTime(cooling, WINDOW.maxC) * (0.5 + 0.4 * next());
      const count = 4 + Math.floor(6 * next());
      return { cooling, every: until / (count - 1), count };
    });
    expect(found.told).toBeGreaterThan(0.75 * RUNS);
    expect(found.share).toBeGreaterThanOrEqual(0.86);
    expect(found.share).toBeLessThanOrEqual(0.94);
  });

  test('two readings in a known bath', () => {
    const found = run((next) => {
      const cooling = { from: 35, towards: 8 + 8 * next(), tau: 30 + 40 * next() };
      return { cooling, coolantC: cooling.towards, every: 15, count: 2 };
    });
    expect(found.share).toBeGreaterThanOrEqual(0.86);
    expect(found.share).toBeLessThanOrEqual(0.94);
  });
});
