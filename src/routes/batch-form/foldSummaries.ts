import type { Board } from '#shared/api/board.ts';
import type { Allergen, Culture, AdditionKind } from '#shared/rules/vocabulary.ts';
import { ADDITION_WORDS, TRUB_WORDS } from '../../app/traitWords.ts';
import { allergenWords, cultureWords } from './batchWords.ts';
import type { BatchValues } from './batchValues.ts';

/** What each fold holds, in a few words. */
export function foldSummaries(values: BatchValues, board: Pick<Board, 'yeasts' | 'vessels'>) {
  return { goesIn: goesIn(values), carries: carries(values), place: place(values, board) };
}

function goesIn(values: BatchValues): string {
  const hops =
    values.dryHopsKnown === 'unknown'
      ? 'dry hops not known'
      : values.dryHopsKnown === 'none'
        ? 'no dry hops'
        : `dry hops ${values.dryHops
            .map((hop) => `${hop.gramsPerLitre.text || '?'} ${hop.gramsPerLitre.unit}`)
            .join(' + ')}`;
  const additions =
    values.additionsKnown === 'unknown'
      ? 'additions not known'
      : values.additionsKnown === 'none'
        ? 'no additions'
        : values.additions
            .map(({ what }) => ADDITION_WORDS[what as AdditionKind].toLowerCase())
            .join(', ');
  return `${hops}; ${additions}`;
}

function carries(values: BatchValues): string {
  const allergens = allergenWords(values.allergens as Allergen[] | null);
  const cultures = values.cultures as Culture[] | null;
  return cultures !== null && cultures.length === 0
    ? allergens
    : `${allergens}; cultures: ${cultureWords(cultures)}`;
}

function place(values: BatchValues, board: Pick<Board, 'yeasts' | 'vessels'>): string {
  const vessel =
    board.vessels.find(({ id }) => id === values.vesselId)?.name ?? "the shelf's vessel";
  const yeast = board.yeasts.find(({ id }) => id === values.yeastId)?.name;
  const parts = [vessel, yeast, `${TRUB_WORDS[values.trub].toLowerCase()} trub`];
  return [...parts, values.notes.trim() && 'a note'].filter(Boolean).join(', ');
}
