import type { UnitPrefs } from '#shared/api/units.ts';
import type { Yeast } from '#shared/api/yeast.ts';
import { formatMoney } from '#shared/units/money.ts';
import { format } from '#shared/units/quantity.ts';
import { YEAST_KIND_WORDS } from '../../app/traitWords.ts';

const LABELS: Record<string, string> = {
  name: 'Name',
  kind: 'Kind',
  character: 'Marked character',
  fermentMinC: 'Ferments from',
  fermentMaxC: 'Ferments up to',
  pourMinC: 'Poured from',
  pourMaxC: 'Poured up to',
  neverAboveC: 'Never above',
  generationLimit: 'Generations at most',
  attenuation: 'Attenuation',
  packPrice: 'Price of a pack',
  notes: 'Notes',
};

export const yeastLabel = (key: string) => LABELS[key] ?? key;

/** A value of a yeast as one would say it. */
export function yeastWords(
  key: string,
  facts: Partial<Yeast>,
  units: UnitPrefs,
  currency: string,
): string {
  const value = facts[key as keyof Yeast];
  if (value === null || value === undefined || value === '') return 'nothing';
  if (key === 'kind') return YEAST_KIND_WORDS[value === 'lager' ? 'lager' : 'ale'];
  if (typeof value === 'boolean') return value ? 'yes' : 'no';
  if (typeof value === 'number') {
    if (key.endsWith('C')) return format('temperature', value, units);
    if (key === 'packPrice') return formatMoney(value, currency);
    if (key === 'attenuation') return `${Math.round(value * 1000) / 10} %`;
  }
  return String(value);
}
