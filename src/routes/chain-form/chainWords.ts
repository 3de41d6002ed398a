import type { Board } from '#shared/api/board.ts';
import type { Chain, ChainStart } from '#shared/api/chain.ts';
import type { Allergen, Culture } from '#shared/rules/vocabulary.ts';
import { formatMoney } from '#shared/units/money.ts';
import { ALLERGEN_WORDS, CULTURE_WORDS } from '../../app/traitWords.ts';

const LABELS: Record<string, string> = {
  name: 'Name of the shelf',
  yeastId: 'Yeast',
  vesselId: 'Vessel',
  start: 'Start',
};

export const chainLabel = (key: string) => LABELS[key] ?? key;

/** A value of a chain as one would say it. */
export function chainWords(key: string, facts: Partial<Chain>, board: Board): string {
  if (key === 'start') return facts.start ? startWords(facts.start, board) : 'nothing';
  const nameOf = (rows: readonly { id: string; name: string }[], id: unknown) =>
    rows.find((row) => row.id === id)?.name ?? 'none';
  if (key === 'yeastId') return nameOf(board.yeasts, facts.yeastId);
  if (key === 'vesselId') return nameOf(board.vessels, facts.vesselId);
  return facts.name ?? '';
}

function startWords(start: ChainStart, board: Board): string {
  const price =
    'price' in start && start.price !== null
      ? `, ${formatMoney(start.price, board.brewery.currency)}`
      : '';
  switch (start.kind) {
    case 'pack':
      return `a fresh pack${price}`;
    case 'cake': {
      const from = board.batches.find((batch) => batch.id === start.batchId);
      return `part of the cake of ${from?.name ?? 'another batch'}`;
    }
    case 'outside':
      return `generation ${start.generation} from outside${price}; ${broughtAlongWords(start.allergens, start.cultures)}`;
  }
}

/** "gluten, milk; cultures not known": what comes with slurry from outside. */
export function broughtAlongWords(
  allergens: readonly Allergen[] | null,
  cultures: readonly Culture[] | null,
): string {
  if (allergens === null && cultures === null) return 'allergens and cultures not known';
  const said = <T extends string>(
    what: string,
    list: readonly T[] | null,
    words: Record<T, string>,
  ) =>
    list === null
      ? `${what} not known`
      : list.length === 0
        ? `no ${what}`
        : list.map((one) => words[one].toLowerCase()).join(', ');
  return [
    said('allergens', allergens, ALLERGEN_WORDS),
    said('cultures', cultures, CULTURE_WORDS),
  ].join('; ');
}
