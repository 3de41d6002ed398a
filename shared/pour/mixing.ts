import { toTenth } from '../rules/rounding.ts';
import { platoFromSg } from '../units/gravity.ts';

const WATER_KG_PER_L = 0.9982;
const CAKE_KG_PER_L = 1.05;

/**
 * kJ/kg/K of a thick yeast slurry: about seven eighths water, the rest dry matter near 1.5. Common
 * practice; the cake is a few per cent of the mass, so the digits of this hardly show.
 */
const CAKE_HEAT = 3.8;

/** Syrups of full purity: sucrose of 100 g in 100 g of extract. */
const PURITY = 100;

/**
 * Specific heat of a wort, kJ/kg/K, from its extract in °P and temperature in °C: the formula for
 * sugar solutions of Bubník et al. 1995 (from memory), within 3 % of ideal mixing with sucrose.
 */
export const wortHeat = (plato: number, celsius: number): number =>
  4.1868 - 0.0297 * plato + 4.6e-5 * plato * PURITY + 7.5e-5 * plato * celsius;

export interface Wort {
  volumeL: number;
  og: number;
}
export interface PourCake {
  volumeL: number;
  c: number;
}

/**
 * Temperature of wort and cake together, °C to 0.1: Σ m c T ÷ Σ m c. The first cells meet nearly the
 * wort's own temperature, so this tempers no verdict.
 */
export function mixedTemperature(wort: Wort, wortC: number, cake: PourCake): number {
  const wortHolds = wort.volumeL * wort.og * WATER_KG_PER_L * wortHeat(platoFromSg(wort.og), wortC);
  const cakeHolds = cake.volumeL * CAKE_KG_PER_L * CAKE_HEAT;
  return toTenth((wortHolds * wortC + cakeHolds * cake.c) / (wortHolds + cakeHolds));
}
