import type { UnitPrefs } from '#shared/api/units.ts';
import type { Vessel } from '#shared/api/vessel.ts';
import { newId } from '../../app/newId.ts';
import { written } from '../../components/form/written.ts';

/** What the fields of a vessel show at first. */
export function vesselValues(vessel: Vessel | null, units: UnitPrefs) {
  const typed = vessel?.typed ?? {};
  return {
    id: vessel?.id ?? newId(),
    name: vessel?.name ?? '',
    shape: vessel?.shape ?? 'bucket',
    capacityL: written('volume', vessel?.capacityL ?? null, units, typed.capacityL),
    blowOff: vessel?.blowOff ?? false,
    minC: written('temperature', vessel?.minC ?? null, units, typed.minC),
    maxC: written('temperature', vessel?.maxC ?? null, units, typed.maxC),
    cleanedOn: vessel?.cleanedOn ?? null,
    notes: vessel?.notes ?? '',
  };
}
