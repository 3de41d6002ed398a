import type { Chain } from '#shared/api/chain.ts';
import type { BoardIndex } from '#shared/chain/board.ts';
import { formatMoney } from '#shared/units/money.ts';

/** Where the yeast of a chain comes from. */
export function startWords({ start }: Chain, index: BoardIndex, currency: string): string {
  switch (start.kind) {
    case 'pack':
      return start.price === null
        ? 'from a fresh pack'
        : `from a fresh pack, ${formatMoney(start.price, currency)}`;
    case 'cake':
      return `from part of the cake of ${index.batch(start.batchId)?.name ?? 'another batch'}`;
    case 'outside':
      return `slurry from outside, generation ${start.generation}`;
  }
}
