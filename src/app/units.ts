import type { UnitPrefs } from '#shared/api/units.ts';

/** Units of a visitor, and of a brewery that has not chosen. */
export const METRIC: UnitPrefs = {
  system: 'metric',
  gravity: 'sg',
  colour: 'srm',
  temperature: 'c',
};
