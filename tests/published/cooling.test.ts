import { describe, expect, test } from 'vitest';
import { forecast } from '#shared/pour/forecast.ts';
import { mixedTemperature, wortHeat } from '#shared/pour/mixing.ts';
import { sgFromPlato } from '#shared/units/gravity.ts';
import { celsiusFromFahrenheit as c } from '#shared/units/temperature.ts';
import { minutes } from '../support/cooling.ts';

/** Worked examples of Newton's law in two textbooks; question and answer from memory. */
describe('cooling', () => {
  test('a cheesecake of 165 °F, 150 °F after 10 minutes at 35 °F, is at 70 °F after about 107 minutes: OpenStax, Precalculus, 4.7', () => {
    const { ready } = forecast({
      readings: [
        { at: minutes(0), c: c(165) },
        { at: minutes(10), c: c(150) },
      ],
      window: { minC: c(60), maxC: c(70) },
      coolantC: c(35),
    });
    expect(Math.abs((ready?.at ?? 0) - minutes(107)) / 60_000).toBeLessThan(1);
  });

  test('coffee of 200 °F, 180 °F after 2 minutes at 70 °F, may be served at 175 °F after about 2.5 minutes: OpenStax, Calculus 1, 6.8', () => {
    const { ready } = forecast({
      readings: [
        { at: minutes(0), c: c(200) },
        { at: minutes(2), c: c(180) },
      ],
      window: { minC: c(155), maxC: c(175) },
      coolantC: c(70),
    });
    expect(Math.abs((ready?.at ?? 0) - minutes(2.5)) / 60_000).toBeLessThan(0.25);
  });

  // τ = 180 min ÷ ln(10 ÷ 6.3) = 389.6 min; 10 °C above the room become 2 after τ × ln 5 = 627 min.
  test('20 L in still air, worked by hand: 28 °C, 24.3 °C after 3 h at 18 °C, 20 °C after 10.5 h', () => {
    const { ready } = forecast({
      readings: [
        { at: minutes(0), c: 28 },
        { at: minutes(180), c: 24.3 },
      ],
      window: { minC: 18.5, maxC: 20 },
      coolantC: 18,
    });
    expect(Math.abs((ready?.at ?? 0) - minutes(627)) / 60_000).toBeLessThan(2);
  });
});

describe('heat', () => {
  test.each([
    [10, 3.951],
    [12, 3.904],
    [15, 3.833],
    [20, 3.715],
    [25, 3.597],
  ])('%d °P at 20 °C holds %d kJ/kg/K: Bubník et al. 1995 (formula from memory)', (plato, kj) => {
    expect(wortHeat(plato, 20)).toBeCloseTo(kj, 3);
  });

  test.each([
    [10, 3.886],
    [12, 3.827],
    [15, 3.738],
    [20, 3.59],
    [25, 3.442],
  ])('%d °P within 5 %% of ideal mixing with sucrose: Mohos 2010, Appendix 2', (plato, kj) => {
    expect(Math.abs(wortHeat(plato, 20) / kj - 1)).toBeLessThan(0.05);
  });

  // Σ m c T ÷ Σ m c, worked by hand.
  test.each([
    [15, 20, 1.5, 4, 18.9],
    [12, 30, 1, 18, 29.4],
  ])('20 L of %d °P at %d °C on %d L at %d °C: %d °C', (plato, wortC, litres, cakeC, together) => {
    const wort = { volumeL: 20, og: sgFromPlato(plato) };
    expect(mixedTemperature(wort, wortC, { volumeL: litres, c: cakeC })).toBe(together);
  });
});
