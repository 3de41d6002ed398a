import type { UnitPrefs } from '#shared/api/units.ts';
import { useSession } from '../api/session.ts';

export const METRIC: UnitPrefs = {
  system: 'metric',
  gravity: 'sg',
  colour: 'srm',
  temperature: 'c',
};

/** Units of whoever is signed in; metric for a visitor. */
export const useUnits = (): UnitPrefs => useSession().data?.units ?? METRIC;
