import type { UnitPrefs } from '#shared/api/units.ts';
import type { Vessel } from '#shared/api/vessel.ts';
import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { SHAPE_WORDS } from '../../app/traitWords.ts';

const LABELS: Record<string, string> = {
  name: 'Name',
  shape: 'Shape',
  capacityL: 'Size to the brim',
  blowOff: 'Blow-off tube',
  minC: 'Holds from',
  maxC: 'Holds up to',
  cleanedOn: 'Last cleaned',
  notes: 'Notes',
};

export const vesselLabel = (key: string) => LABELS[key] ?? key;

/** A value of a vessel as one would say it. */
export function vesselWords(key: string, facts: Partial<Vessel>, units: UnitPrefs): string {
  if (key === 'shape' && facts.shape) return SHAPE_WORDS[facts.shape];
  if (key === 'cleanedOn' && facts.cleanedOn) return formatDay(facts.cleanedOn);
  const value = facts[key as keyof Vessel];
  if (value === null || value === undefined || value === '') return 'nothing';
  if (typeof value === 'boolean') return value ? 'fitted' : 'none';
  if (typeof value === 'number')
    return format(key === 'capacityL' ? 'volume' : 'temperature', value, units);
  return String(value);
}
