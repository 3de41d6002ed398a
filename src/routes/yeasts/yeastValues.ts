import type { UnitPrefs } from '#shared/api/units.ts';
import type { Yeast } from '#shared/api/yeast.ts';
import { moneyKind } from '../../components/form/plainNumbers.ts';
import { written } from '../../components/form/written.ts';
import { newId } from '../../app/newId.ts';

/** What the fields of a yeast show at first. */
export function yeastValues(yeast: Yeast | null, units: UnitPrefs, currency: string) {
  const typed = yeast?.typed ?? {};
  const celsius = (key: 'fermentMinC' | 'fermentMaxC' | 'pourMinC' | 'pourMaxC' | 'neverAboveC') =>
    written('temperature', yeast?.[key] ?? null, units, typed[key]);
  return {
    id: yeast?.id ?? newId(),
    name: yeast?.name ?? '',
    kind: yeast?.kind ?? 'ale',
    character: yeast?.character ?? false,
    fermentMinC: celsius('fermentMinC'),
    fermentMaxC: celsius('fermentMaxC'),
    pourMinC: celsius('pourMinC'),
    pourMaxC: celsius('pourMaxC'),
    neverAboveC: celsius('neverAboveC'),
    generationLimit: written('count', yeast?.generationLimit ?? null, units, typed.generationLimit),
    attenuation: written('percent', yeast?.attenuation ?? null, units, typed.attenuation),
    packPrice: written(moneyKind(currency), yeast?.packPrice ?? null, units, typed.packPrice),
    notes: yeast?.notes ?? '',
  };
}
