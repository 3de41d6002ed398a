import type { Batch } from '#shared/api/batch.ts';
import { indexBoard, type BoardFacts } from '#shared/chain/board.ts';
import type { BoardPlan } from '../../../e2e/support/board.ts';

/** A made-up board as rows to write: its shelves with their batches, and its bench. */
export function planOf(board: BoardFacts): BoardPlan {
  const index = indexBoard(board);
  return {
    shelves: index.chains.map(({ id, name }) => ({
      name,
      batches: index.batchesOf(id).map(beerOf),
    })),
    bench: index.bench.map(beerOf),
  };
}

const beerOf = ({ name, og, fg, srm, ibu, dryHops, allergens, brewOn }: Batch) => ({
  name,
  og,
  fg,
  srm,
  ibu,
  dryHops,
  allergens,
  brewOn,
});
