import type { UnitPrefs } from '#shared/api/units.ts';
import { format, formatBare, unitOf } from '#shared/units/quantity.ts';

/** "18–22 °C", or null where an end is unknown. */
export function temperatureRange(min: number | null, max: number | null, units: UnitPrefs) {
  if (min === null || max === null) return null;
  return `${formatBare('temperature', min, units)}–${formatBare('temperature', max, units)} ${unitOf('temperature', units)}`;
}

/** One end may be open: "from 4 °C", "up to 24 °C". */
export function temperaturesHeld(min: number | null, max: number | null, units: UnitPrefs) {
  if (min !== null && max !== null) return temperatureRange(min, max, units);
  if (min !== null) return `from ${format('temperature', min, units)}`;
  if (max !== null) return `up to ${format('temperature', max, units)}`;
  return null;
}
