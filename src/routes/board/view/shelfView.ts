import { useMemo, useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { originOf } from '../../descent/descentOf.ts';
import type { BoardViewValue } from './BoardView.tsx';
import { vesselOf } from './drawing.ts';

/** Everything that is drawn of a shelf, as rows that stay the same object while they stay equal. */
function concernsOf(view: BoardViewValue, chain: Chain): readonly unknown[] {
  const { board, index, judged, units, slug, can, online } = view;
  const batches = index.batchesOf(chain.id);
  const origin = originOf(board, index, chain);
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
    origin?.source,
    origin?.partL,
    origin?.wholeL,
    board.unread[chain.id],
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

/** Gives the views of a board's shelves, and keeps those of the last board that are still good. */
function createShelfViews() {
  let before: ReadonlyMap<string, Kept> = new Map();
  return (view: BoardViewValue): ReadonlyMap<string, BoardViewValue> => {
    const now = new Map<string, Kept>();
    for (const chain of view.index.chains) {
      const concerns = concernsOf(view, chain);
      const kept = before.get(chain.id);
      now.set(chain.id, kept && areSame(kept.concerns, concerns) ? kept : { concerns, view });
    }
    before = now;
    return new Map([...now].map(([id, kept]) => [id, kept.view]));
  };
}

/**
 * The board as each shelf shows it: the same object for as long as nothing changes on that shelf, so
 * that a move draws two shelves anew and not all of them. What it holds of other shelves may be old.
 */
export function useShelfViews(view: BoardViewValue): ReadonlyMap<string, BoardViewValue> {
  const [viewsOf] = useState(createShelfViews);
  return useMemo(() => viewsOf(view), [view, viewsOf]);
}
