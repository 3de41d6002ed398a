import type { UnitPrefs } from '#shared/api/units.ts';
import { format } from '#shared/units/quantity.ts';
import type { Written } from '../../../components/form/written.ts';

/** Wort is water enough: below this it is ice, above that steam, °C. */
const ICE_C = 0;
const STEAM_C = 105;

/** Why a typed temperature of the wort cannot be taken, with what to do; null: it can. */
export function readingFault({ value, why, text }: Written, units: UnitPrefs): string | null {
  if (why !== null) return why;
  if (value === null)
    return text.trim() === '' ? 'Write the temperature that the thermometer shows' : why;
  if (value < ICE_C)
    return `${format('temperature', value, units)} would be ice: look at the thermometer again`;
  if (value > STEAM_C)
    return `${format('temperature', value, units)} would be steam: look at the thermometer again`;
  return null;
}
