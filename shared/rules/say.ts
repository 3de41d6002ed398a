import type { UnitPrefs } from '../api/units.ts';
import { formatDay } from '../units/day.ts';
import { platoFromSg } from '../units/gravity.ts';
import { DEFAULT_UNITS, format } from '../units/quantity.ts';
import type { Day } from './vocabulary.ts';

/** Writes the figures of a finding's sentences, with units, in the reader's own. */
export interface Say {
  gravity(sg: number): string;
  /** A difference between two gravities: points, or °P. */
  gravityGap(highSg: number, lowSg: number): string;
  colour(srm: number): string;
  bitterness(ibu: number): string;
  temperature(c: number): string;
  /** A difference of temperatures. */
  degrees(c: number): string;
  volume(litres: number): string;
  /** A part of a cake. */
  part(litres: number): string;
  rate(gramsPerLitre: number): string;
  percent(share: number): string;
  day(day: Day): string;
}

export function sayIn(units: UnitPrefs): Say {
  return {
    gravity: (sg) => format('gravity', sg, units),
    gravityGap: (high, low) =>
      units.gravity === 'plato'
        ? `${atMost(platoFromSg(high) - platoFromSg(low), 1)} °P`
        : `${atMost((high - low) * 1000, 1)} points`,
    colour: (srm) => format('colour', srm, units),
    bitterness: (ibu) => format('bitterness', ibu, units),
    temperature: (c) => format('temperature', c, units),
    degrees: (c) => format('temperatureStep', c, units),
    volume: (litres) => format('volume', litres, units),
    part: (litres) => format('smallVolume', litres, units),
    rate: (gramsPerLitre) => format('hopRate', gramsPerLitre, units),
    percent: (share) => `${atMost(share * 100, share < 0.1 ? 1 : 0)} %`,
    day: formatDay,
  };
}

export const SAY_DEFAULT: Say = sayIn(DEFAULT_UNITS);

/** A number with at most so many decimals, none of them idle. */
export function atMost(value: number, decimals: 0 | 1 | 2): string {
  const scale = decimals === 2 ? 100 : decimals === 1 ? 10 : 1;
  return String(Math.round(value * scale) / scale).replace('-', '−');
}

export const days = (count: number): string =>
  Math.abs(count) === 1 ? `${count} day` : `${atMost(count, 0)} days`;

/** `a, b and c`. */
export function listed(words: readonly string[]): string {
  if (words.length < 2) return words[0] ?? '';
  return `${words.slice(0, -1).join(', ')} and ${words[words.length - 1] ?? ''}`;
}
