import type { Batch } from '#shared/api/batch.ts';
import type { BoardFacts } from '#shared/chain/board.ts';
import { chainAlone } from '#shared/chain/chainAlone.ts';
import type { BoardRows } from '../board/load.ts';
import { ofBrewery } from '../share/present.ts';

/** A board as a guest sees it: their chains, the yeasts and vessels of these, no prices and no people. */
export function guestView<B extends BoardRows & Pick<BoardFacts, 'today'>>(
  board: B,
  chainIds: Iterable<string>,
  breweryName: string,
): B {
  const alone = [...chainIds].flatMap((id) => chainAlone(board, id) ?? []);
  const ids = (rows: readonly { id: string }[]) => new Set(rows.map(({ id }) => id));
  const yeasts = ids(alone.flatMap((each) => each.yeasts));
  const vessels = ids(alone.flatMap((each) => each.vessels));
  return {
    ...board,
    season: { ...board.season, name: breweryName },
    members: [],
    yeasts: board.yeasts
      .filter(({ id }) => yeasts.has(id))
      .map((yeast) => ({ ...yeast, packPrice: null })),
    vessels: board.vessels.filter(({ id }) => vessels.has(id)),
    chains: alone.map(({ chain }) => {
      const { start } = chain;
      return { ...chain, start: 'price' in start ? { ...start, price: null } : start };
    }),
    batches: alone.flatMap(({ batches }) => batches.map((row) => guestBatch(row, breweryName))),
  };
}

export const guestBatch = (row: Batch, breweryName: string): Batch => ({
  ...row,
  link: { ...row.link, acceptance: ofBrewery(row.link.acceptance, breweryName) },
});
