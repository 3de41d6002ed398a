import type { UnitPrefs } from '#shared/api/units.ts';
import { format, formatBare, type QuantityKind } from '#shared/units/quantity.ts';

const KINDS: Readonly<Record<string, QuantityKind>> = {
  SG: 'gravity',
  SRM: 'colour',
  IBU: 'bitterness',
  '°C': 'temperature',
  L: 'volume',
  'g/L': 'hopRate',
};

const rounded = (value: number): string => {
  const digits = Math.abs(value) >= 100 ? 0 : Math.abs(value) >= 10 ? 1 : 2;
  return String(Number(value.toFixed(digits))).replace('-', '−');
};

/** A measured value in the person's units: "2 g/L", "1.076", "ΔE00 1.4", "3.5 × need". */
export function measureText(value: number, unit: string, units: UnitPrefs): string {
  const kind = KINDS[unit];
  if (kind === 'gravity' && units.gravity === 'sg') return formatBare(kind, value, units);
  if (kind) return format(kind, value, units);
  if (unit === 'ΔE00') return `ΔE00 ${rounded(value)}`;
  if (unit === '%') return `${rounded(value)} %`;
  return unit === '' ? rounded(value) : `${rounded(value)} ${unit}`;
}
