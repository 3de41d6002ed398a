import type { Batch } from '#shared/api/batch.ts';
import type { Unchecked } from '#shared/rules/answer.ts';
import type { NumberKind } from '../../../components/form/readers.ts';
import { fgOf, ogOf, volumeOf } from '../view/words.ts';

/** A fact that a check waits for, and the batch that lacks it. */
export interface MissingField {
  key: string;
  batch: Batch;
  field: NumberField | ListField;
}

export type NumberField = keyof typeof NUMBERS;
export type ListField = keyof typeof LISTS;

export const NUMBERS = {
  volumeL: { kind: 'volume', label: 'Volume', read: volumeOf },
  og: { kind: 'gravity', label: 'Original gravity', read: ogOf },
  fg: { kind: 'gravity', label: 'Final gravity', read: fgOf },
  srm: { kind: 'colour', label: 'Colour', read: (batch: Batch) => batch.srm },
  ibu: { kind: 'bitterness', label: 'Bitterness', read: (batch: Batch) => batch.ibu },
  fermentC: { kind: 'temperature', label: 'Ferments at', read: (batch: Batch) => batch.fermentC },
  daysUnderBeer: {
    kind: 'days',
    label: 'Days until racking',
    read: (batch: Batch) => batch.daysUnderBeer,
  },
} as const satisfies Record<
  string,
  { kind: NumberKind; label: string; read: (batch: Batch) => number | null }
>;

/** Facts that are lists: unknown until somebody says that there are none, or which. */
export const LISTS = {
  dryHops: { label: 'Dry hops', none: 'No dry hops' },
  additions: { label: 'Additions', none: 'No additions' },
  allergens: { label: 'Allergens', none: 'No allergens' },
  cultures: { label: 'Wild cultures and enzymes', none: 'None of them' },
} as const;

/** The check contract calls the list of dry hops by its single entry. */
const asField = (name: string) => (name === 'dryHop' ? 'dryHops' : name);

export const isNumberField = (field: string): field is NumberField => field in NUMBERS;
export const isListField = (field: string): field is ListField => field in LISTS;

const lacks = (batch: Batch, field: NumberField | ListField): boolean =>
  isNumberField(field) ? NUMBERS[field].read(batch) === null : batch[field] === null;

/** Every fact that would let an unchecked rule speak, each once, of whichever batch lacks it. */
export function missingFields(
  unchecked: readonly Unchecked[],
  batches: readonly Batch[],
): MissingField[] {
  const found = new Map<string, MissingField>();
  for (const name of unchecked.flatMap((rule) => rule.missing)) {
    const field = asField(name);
    if (!isNumberField(field) && !isListField(field)) continue;
    for (const batch of batches) {
      const key = `${batch.id}:${field}`;
      if (lacks(batch, field)) found.set(key, { key, batch, field });
    }
  }
  return [...found.values()];
}
