import type { UnitPrefs } from '#shared/api/units.ts';
import { invalidField } from '../../problems.ts';

export const DEFAULT_UNITS: UnitPrefs = {
  system: 'metric',
  gravity: 'sg',
  colour: 'srm',
  temperature: 'c',
};
export const DEFAULT_CURRENCY = 'EUR';
export const DEFAULT_TIME_ZONE = 'UTC';

/** Refuses a time zone that is not in the IANA list which this Node carries. */
export function demandTimeZone(name: string): string {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: name }).resolvedOptions().timeZone;
  } catch {
    throw invalidField('/timeZone', 'There is no such time zone');
  }
}
