import type { BoardFacts } from '#shared/chain/board.ts';
import type { Gap } from '#shared/chain/gaps.ts';
import type { Intent } from './keys.ts';
import { indexed } from './indexed.ts';

export const gapKey = (chainId: string, afterBatchId: string | null) =>
  `${chainId}:${afterBatchId ?? 'first'}`;

/** Keys of every place, shelf by shelf from the top, then a new shelf and the bench. */
function everyKey(board: BoardFacts): string[] {
  const { chains, batchesOf } = indexed(board);
  const onShelves = chains.flatMap((chain) => [
    gapKey(chain.id, null),
    ...batchesOf(chain.id).map((batch) => gapKey(chain.id, batch.id)),
  ]);
  return [...onShelves, 'new', 'bench'];
}

/** True where the lifted batch can be put down. */
export const isOpen = (gap: Gap) => gap.locked === null && !gap.here;

/** The places that the keys walk. Locked ones are left out: nothing can be put there. */
export interface Walk {
  alongShelves: readonly string[];
  ranked: readonly string[];
  /** How many places of `alongShelves` lie before the one that the batch was lifted from. */
  start: number;
}

export function walkOf(board: BoardFacts, ranked: readonly Gap[], batchId: string): Walk {
  const open = new Set(ranked.filter(isOpen).map((gap) => gap.key));
  const keys = everyKey(board);
  const chainId = board.batches.find((batch) => batch.id === batchId)?.chainId ?? null;
  const from = keys.indexOf(chainId === null ? 'bench' : gapKey(chainId, batchId));
  return {
    alongShelves: keys.filter((key) => open.has(key)),
    ranked: ranked.map((gap) => gap.key).filter((key) => open.has(key)),
    start: keys.slice(0, from).filter((key) => open.has(key)).length,
  };
}

const clamped = (keys: readonly string[], index: number) =>
  keys[Math.min(Math.max(index, 0), keys.length - 1)] ?? null;

const around = (keys: readonly string[], index: number) =>
  keys.at(keys.length === 0 ? 0 : index % keys.length) ?? null;

/**
 * The place that a step leads to. Along the shelves the walk goes round, from the last place to
 * the first; the ranked list has a best and a worst end.
 */
export function step(walk: Walk, over: string | null, intent: Intent): string | null {
  const { alongShelves, ranked, start } = walk;
  const here = over === null ? -1 : alongShelves.indexOf(over);
  switch (intent) {
    case 'next':
      return around(alongShelves, here === -1 ? start : here + 1);
    case 'previous':
      return around(alongShelves, (here === -1 ? start : here) - 1);
    case 'worse':
      return clamped(ranked, over === null ? 0 : ranked.indexOf(over) + 1);
    case 'better':
      return clamped(ranked, over === null ? 0 : ranked.indexOf(over) - 1);
    case 'best':
      return clamped(ranked, 0);
    case 'put-down':
    case 'put-back':
      return over;
  }
}
