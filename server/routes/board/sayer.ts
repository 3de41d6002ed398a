import type { Sayer } from '#shared/record/words.ts';
import type { Hand } from './hand.ts';

/** The record speaks in the brewery's units and money, whoever writes or reads it. */
export function sayerOf({ member, board }: Pick<Hand, 'member' | 'board'>): Sayer {
  const { units, currency } = member.brewery;
  const rows = [...board.yeasts, ...board.vessels, ...board.batches];
  return { units, currency, nameOf: (id) => rows.find((row) => row.id === id)?.name ?? null };
}
