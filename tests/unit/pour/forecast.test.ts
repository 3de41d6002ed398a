import { describe, expect, test } from 'vitest';
import { forecast } from '#shared/pour/forecast.ts';
import { minutes, trueC, trueTime, type Cooling } from '../../support/cooling.ts';

const WINDOW = { minC: 18, maxC: 22 };
const exact = (cooling: Cooling, times: readonly number[]) =>
  times.map((t) => ({ at: minutes(t), c: trueC(cooling, t) }));
const of = (cs: readonly number[], every = 10, coolantC?: number) =>
  forecast({
    readings: cs.map((c, n) => ({ at: minutes(n * every), c })),
    window: WINDOW,
    coolantC,
  });

describe('why there is no forecast', () => {
  test.each([
    ['nothing read', [], undefined, /first reading/],
    ['one reading', [30], 12, /another reading/],
    ['two without the coolant', [30, 26], undefined, /too few.*third/],
    ['a coolant that is too warm', [30, 26, 25], 23, /not below 22 °C/],
    ['wort that warms', [24, 24.9, 26.1, 27], undefined, /getting warmer/],
    ['two that warm', [25, 27], 16, /getting warmer/],
    [
      'wort that stalls',
      [45, 33.6, 28.7, 26.5, 25.7, 25.3, 25.1, 25, 25.1, 25],
      undefined,
      /levels off near 25/,
    ],
    ['hardly a slope', [30, 29.9, 30, 29.8], undefined, /cannot yet tell/],
    ['cold and colder', [16, 15, 14.2, 13.4], undefined, /still getting colder/],
    ['cold and few', [16, 16.4], undefined, /below the window/],
  ])('%s', (_name, cs, coolantC, why) => {
    const found = of(cs, 10, coolantC);
    expect(found.ready).toBeNull();
    expect(found.whyNot).toMatch(why);
  });

  test('inside: nothing to say', () => {
    expect(of([24, 21])).toMatchObject({ ready: null, whyNot: null });
  });
});

describe('exact coolings', () => {
  const cooling = { from: 60, towards: 12, tau: 25 };
  test('two readings in a known bath meet the true time', () => {
    const { ready } = forecast({
      readings: exact(cooling, [0, 20]),
      window: WINDOW,
      coolantC: 12,
    });
    expect(ready?.at).toBeCloseTo(minutes(trueTime(cooling, 22)), -4.5);
  });
  test('five readings, in any order, need no bath', () => {
    const { ready, ahead } = forecast({
      readings: exact(cooling, [24, 0, 6, 18, 12]),
      window: WINDOW,
    });
    const truly = minutes(trueTime(cooling, 22));
    expect(Math.abs((ready?.at ?? 0) - truly)).toBeLessThan(0.01 * (truly - minutes(0)));
    expect(ahead?.(minutes(30))).toBeCloseTo(trueC(cooling, 30), 1);
  });
  test('cold wort warms into the window from below', () => {
    const warming = { from: 8, towards: 24, tau: 50 };
    const { ready } = forecast({ readings: exact(warming, [0, 10, 20, 30, 40]), window: WINDOW });
    const truly = minutes(trueTime(warming, 18));
    expect(Math.abs((ready?.at ?? 0) - truly)).toBeLessThan(60_000);
  });
  test('readings from before the chiller was turned on are left out', () => {
    const slowly = { from: 80, towards: 16, tau: 400 };
    const quickly = { from: trueC(slowly, 30), towards: 12, tau: 18 };
    const before = exact(slowly, [0, 10, 20, 30]);
    const since = exact(quickly, [5, 10, 15, 20]).map(({ at, c }) => ({
      at: at + 30 * 60_000,
      c,
    }));
    const { ready } = forecast({ readings: [...before, ...since], window: WINDOW });
    const truly = minutes(30 + trueTime(quickly, 22));
    expect(Math.abs((ready?.at ?? 0) - truly)).toBeLessThan(60_000);
  });
});
