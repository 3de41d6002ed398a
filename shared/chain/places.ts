import type { Batch } from '../api/batch.ts';
import type { BoardIndex } from './board.ts';
import type { Draft } from './draft.ts';

/**
 * The rows of a draft with their places from 0, changed rows only: of the chains named (null: the
 * bench, in the order given) and of any row that the draft replaced. Scrapped batches that still
 * bear a place there come after the others, so that no two rows share one.
 */
export function renumbered(
  index: BoardIndex,
  draft: Draft,
  chainIds: readonly (string | null)[],
  bench: readonly Batch[],
): Batch[] {
  const places = new Map<string, number>();
  for (const chainId of new Set(chainIds)) {
    const mates = chainId === null ? bench : draft.batchesOf(chainId);
    const scrapped = index.scrapped.filter((batch) => batch.chainId === chainId);
    [...mates, ...scrapped].forEach((mate, place) => places.set(mate.id, place));
  }
  const ids = new Set([...places.keys(), ...draft.rows.keys()]);
  return [...ids].flatMap((id) => {
    const before = index.batch(id);
    const row = draft.batch(id);
    if (!before || !row) return [];
    const place = places.get(id) ?? row.place;
    if (place === before.place && sameRow(before, row)) return [];
    return [place === row.place ? row : { ...row, place }];
  });
}

const sameRow = (a: Batch, b: Batch): boolean =>
  a === b || (a.chainId === b.chainId && a.brewOn === b.brewOn && a.link === b.link);
