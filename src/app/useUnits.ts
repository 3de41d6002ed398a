import type { UnitPrefs } from '#shared/api/units.ts';
import { useSession } from '../api/session.ts';
import { METRIC } from './units.ts';

/** Units of whoever is signed in; metric for a visitor. */
export const useUnits = (): UnitPrefs => useSession().data?.units ?? METRIC;
