import type { Board } from '#shared/api/board.ts';
import type { Chain, ChainStart } from '#shared/api/chain.ts';
import { formatMoney } from '#shared/units/money.ts';

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
      return `generation ${start.generation} from outside${price}`;
  }
}
