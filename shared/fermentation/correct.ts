import { platoFromSg, sgFromPlato } from '../units/gravity.ts';
import { correctedSg, HYDROMETER_MAX_C } from '../units/water.ts';

export interface Shown {
  kind: 'gravity' | 'temperature' | 'ph';
  method: 'hydrometer' | 'refractometer' | null;
  /** As the instrument showed it: SG, °Bx of a refractometer, °C or pH. */
  shown: number;
  /** Of a hydrometer's sample, °C; null: at the hydrometer's own temperature. */
  sampleC: number | null;
}

export interface Instrument {
  /** Added to what it shows, in its own scale. */
  correction: number;
  /** Temperature that a hydrometer is made for, °C; null: 20. */
  calibratedC: number | null;
}

export const HYDROMETER_MADE_FOR_C = 20;

/**
 * A refractometer is scaled in sucrose; wort bends light about 4 % more than sugar of the same
 * extract (common practice: divide by 1.04; yours may differ, so that it is checked once against a
 * hydrometer).
 */
export const WORT_FACTOR = 1.04;

/** Why a refractometer is not read once a beer ferments. */
export const WHY_NOT_REFRACTED =
  'Alcohol bends light more than water does, so that a refractometer reads a fermenting beer too high. Use a hydrometer.';

/** SG of unfermented wort from a refractometer's °Bx (0 to 40); above it a RangeError. */
export function sgFromBrix(brix: number): number {
  if (!(brix >= 0 && brix <= 40)) throw new RangeError('A refractometer shows 0 to 40 °Bx');
  return sgFromPlato(brix / WORT_FACTOR);
}

/** What a refractometer would show for a wort, °Bx. */
export const brixOf = (sg: number): number => platoFromSg(sg) * WORT_FACTOR;

/**
 * The value of a reading, SG, °C or pH: with the instrument's own correction, and a hydrometer's
 * sample brought to the temperature that it is made for (see `correctedSg`: first order, wort taken
 * to expand as water). Throws a RangeError for a sample outside 0–40 °C or a °Bx outside 0–40.
 */
export function valueOf(reading: Shown, instrument: Instrument | null): number {
  const read = reading.shown + (instrument?.correction ?? 0);
  if (reading.kind !== 'gravity') return read;
  if (reading.method === 'refractometer') return sgFromBrix(read);
  if (reading.sampleC === null) return read;
  return correctedSg(read, reading.sampleC, instrument?.calibratedC ?? HYDROMETER_MADE_FOR_C);
}

/** What is wrong with a sample's temperature, in words; null: nothing. */
export const sampleFault = (sampleC: number | null): string | null =>
  sampleC !== null && !(sampleC >= 0 && sampleC <= HYDROMETER_MAX_C)
    ? `Cool or warm the sample to between 0 and ${HYDROMETER_MAX_C} °C (32 and 104 °F) first: beyond it the correction is not known`
    : null;
