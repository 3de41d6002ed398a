import type { UnitPrefs } from '#shared/api/units.ts';
import { format } from '#shared/units/quantity.ts';
import type { Origin } from './descentOf.ts';

/** ", 0.4 of 1.1 L"; empty where it is not known. */
export function partWords({ partL, wholeL }: Pick<Origin, 'partL' | 'wholeL'>, units: UnitPrefs) {
  if (partL === null || wholeL === null) return '';
  return `, ${format('smallVolume', partL, units)} of ${format('smallVolume', wholeL, units)}`;
}
