import { useMemo, useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import type { BoardViewValue } from './BoardView.tsx';
import { vesselOf } from './drawing.ts';

/** Everything that is drawn of a shelf, as rows that stay the same object while they stay equal. */
function concernsOf(view: BoardViewValue, chain: Chain): readonly unknown[] {
  const { board, index, judged, units, slug, can, online } = view;
  const batches = index.batchesOf(chain.id);
  return [
    chain,
    units,
    slug,
    can,
    online,
    board.today,
    board.brewery.currency,
    index.yeasts.get(chain.yeastId),
    chain.vesselId === null ? null : index.vessels.get(chain.vesselId),
    chain.start.kind === 'cake' ? index.batch(chain.start.batchId) : null,
    judged.chains.get(chain.id),
    ...batches.flatMap((batch) => [batch, vesselOf(batch, index), judged.links.get(batch.id)]),
  ];
}

const areSame = (one: readonly unknown[], other: readonly unknown[]) =>
  one.length === other.length && one.every((each, at) => Object.is(each, other[at]));

interface Kept {
  concerns: readonly unknown[];
  view: BoardViewValue;
}

/** Remembers of each shelf the view it was last drawn from. */
function shelfViewKeeper() {
  let kept: ReadonlyMap<string, Kept> = new Map();
  return (view: BoardViewValue): ReadonlyMap<string, BoardViewValue> => {
    const now = new Map<string, Kept>();
    for (const chain of view.index.chains) {
      const concerns = concernsOf(view, chain);
      const before = kept.get(chain.id);
      now.set(chain.id, before && areSame(before.concerns, concerns) ? before : { concerns, view });
    }
    kept = now;
    return new Map([...now].map(([id, one]) => [id, one.view]));
  };
}

/**
 * The board as each shelf shows it: the same object for as long as nothing changes on that shelf, so
 * that a move draws two shelves anew and not all of them. What it holds of other shelves may be old.
 */
export function useShelfViews(view: BoardViewValue): ReadonlyMap<string, BoardViewValue> {
  const [viewsOf] = useState(shelfViewKeeper);
  return useMemo(() => viewsOf(view), [viewsOf, view]);
}
