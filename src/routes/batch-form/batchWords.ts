import type { Batch } from '#shared/api/batch.ts';
import type { Board } from '#shared/api/board.ts';
import type { UnitPrefs } from '#shared/api/units.ts';
import { formatDay } from '#shared/units/day.ts';
import { format, type QuantityKind } from '#shared/units/quantity.ts';
import {
  ADDITION_WORDS,
  ALLERGEN_WORDS,
  CULTURE_WORDS,
  HOP_WORDS,
  TIMING_WORDS,
  TRUB_WORDS,
} from '../../app/traitWords.ts';

const LABELS: Record<string, string> = {
  name: 'Name',
  style: 'Style',
  volumeL: 'Volume',
  og: 'Original gravity',
  fg: 'Final gravity',
  srm: 'Colour',
  ibu: 'Bitterness',
  fermentC: 'Ferments at',
  daysUnderBeer: 'Days under beer',
  brewOn: 'Brew day',
  wantedOn: 'Wanted on',
  dryHops: 'Dry hops',
  additions: 'Additions',
  allergens: 'Allergens',
  cultures: 'Cultures',
  trub: 'Trub',
  vesselId: 'Vessel',
  yeastId: 'Yeast asked for',
  notes: 'Notes',
};

export const batchLabel = (key: string) => LABELS[key] ?? key;

const KINDS: Record<string, QuantityKind> = {
  volumeL: 'volume',
  og: 'gravity',
  fg: 'gravity',
  srm: 'colour',
  ibu: 'bitterness',
  fermentC: 'temperature',
};

const listed = (words: readonly string[], none = 'none') =>
  words.length === 0 ? none : words.join(', ');

export function dryHopWords(hops: Batch['dryHops'], units: UnitPrefs): string {
  if (hops === null) return 'not known';
  return listed(
    hops.map(
      (hop) =>
        `${format('hopRate', hop.gramsPerLitre, units)} ${HOP_WORDS[hop.contained].toLowerCase()}, ${TIMING_WORDS[hop.timing].toLowerCase()}`,
    ),
  );
}

export const additionWords = (additions: Batch['additions']): string =>
  additions === null
    ? 'not known'
    : listed(additions.map(({ what }) => ADDITION_WORDS[what].toLowerCase()));

export const allergenWords = (allergens: Batch['allergens']): string =>
  allergens === null
    ? 'not known'
    : listed(allergens.map((one) => ALLERGEN_WORDS[one].toLowerCase()));

export const cultureWords = (cultures: Batch['cultures']): string =>
  cultures === null ? 'not known' : listed(cultures.map((one) => CULTURE_WORDS[one].toLowerCase()));

/** A value of a batch as one would say it. */
export function batchWords(
  key: string,
  facts: Partial<Batch>,
  units: UnitPrefs,
  board: Pick<Board, 'yeasts' | 'vessels'>,
): string {
  if (key === 'dryHops') return dryHopWords(facts.dryHops ?? null, units);
  if (key === 'additions') return additionWords(facts.additions ?? null);
  if (key === 'allergens') return allergenWords(facts.allergens ?? null);
  if (key === 'cultures') return cultureWords(facts.cultures ?? null);
  if (key === 'trub' && facts.trub) return TRUB_WORDS[facts.trub].toLowerCase();
  const value = facts[key as keyof Batch];
  if (value === null || value === undefined || value === '') return 'nothing';
  const named = [...board.yeasts, ...board.vessels].find((row) => row.id === value);
  if (named) return named.name;
  const kind = KINDS[key];
  if (kind && typeof value === 'number') return format(kind, value, units);
  if (key === 'daysUnderBeer') return `${String(value)} days`;
  if (key.endsWith('On')) return formatDay(String(value));
  return String(value);
}
