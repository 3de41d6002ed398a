import type { Batch } from '../api/batch.ts';
import type { ChainStart } from '../api/chain.ts';
import type { Inheritance } from '../rules/facts.ts';
import type { Layout } from './board.ts';
import { NOTHING_INHERITED } from './inherit.ts';

/** Where a batch stands in the descent of its yeast. */
export interface Descent {
  /** Null: not known, as in a chain whose first cake is not known. */
  generation: number | null;
  /** What the beers before it on this yeast hand down. */
  inherited: Inheritance;
}

/** Hands the allergens, cultures and strength of one beer down to the next. */
export type HandDown = (before: Inheritance, earlier: Batch) => Inheritance;

/** Nobody knows what came before. */
export const UNKNOWN_INHERITED: Inheritance = {
  ...NOTHING_INHERITED,
  ogUnknown: true,
  allergensUnknown: true,
  culturesUnknown: true,
};
/** Nobody knows what was before: the cake that starts the chain is gone, or hangs on itself. */
const LOST: Descent = { generation: null, inherited: UNKNOWN_INHERITED };
const UNSTARTED: Descent = { generation: null, inherited: NOTHING_INHERITED };

/**
 * The descent of any batch of a layout, along its chain and through the cakes that chains start
 * from. `settled` answers for batches whose descent is known already.
 */
export function descents(
  layout: Layout,
  handDown: HandDown,
  settled: (batchId: string) => Descent | undefined = () => undefined,
): (batch: Batch) => Descent {
  const found = new Map<string, Descent>();
  const descentOf = (batch: Batch): Descent => {
    const done = found.get(batch.id) ?? settled(batch.id);
    if (done) return done;
    // Stands while the way up is walked, so that a circle of chains comes to an end.
    found.set(batch.id, LOST);
    const earlier = layout.predecessor(batch.id);
    const descent = earlier ? below(descentOf(earlier), earlier) : startOf(layout, batch);
    found.set(batch.id, descent);
    return descent;
  };
  const below = ({ generation, inherited }: Descent, earlier: Batch): Descent => ({
    generation: generation === null ? null : generation + 1,
    inherited: handDown(inherited, earlier),
  });
  return descentOf;
}

function startOf(layout: Layout, batch: Batch): Descent {
  const start = batch.chainId === null ? undefined : layout.chain(batch.chainId)?.start;
  switch (start?.kind) {
    case 'pack':
      return { generation: 1, inherited: NOTHING_INHERITED };
    case 'outside':
      return { generation: start.generation, inherited: broughtAlong(start) };
    case 'cake':
      return LOST;
    case undefined:
      return UNSTARTED;
  }
}

/** What slurry from outside hands down to the first beer, as far as it is written down. */
export function broughtAlong({
  allergens,
  cultures,
}: Extract<ChainStart, { kind: 'outside' }>): Inheritance {
  return {
    ...NOTHING_INHERITED,
    allergens: allergens ?? [],
    cultures: cultures ?? [],
    allergensUnknown: allergens === null,
    culturesUnknown: cultures === null,
  };
}
