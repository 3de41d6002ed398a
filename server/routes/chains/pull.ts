import { pullChain } from '#shared/chain/dates.ts';
import { writeBatch } from '../batches/rows.ts';
import type { Command } from '../board/changeBoard.ts';
import { one } from '../board/find.ts';

/** Every pencilled batch of a chain brewed on the day the yeast before it is taken: one change, one undo. */
export const pullDates =
  (id: string): Command =>
  async ({ tx, board }) => {
    const { name } = one(board.chains, id);
    const { batches, shifted } = pullChain(board, id);
    if (batches.length === 0) return null;
    for (const { id: batchId, brewOn, link } of batches)
      await writeBatch(tx, board, batchId, { brewOn, takenOn: link.takenOn });
    const dates = shifted.length === 1 ? '1 date' : `${shifted.length} dates`;
    return { what: `Pulled ${dates} on ${name} along`, touches: [id] };
  };
