import { memo, useId } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { BoardPartView, type BoardViewValue } from '../view/BoardView.tsx';
import { ShelfBatch } from './ShelfBatch.tsx';
import { ShelfLabel } from './ShelfLabel.tsx';
import { ShelfRun } from './ShelfRun.tsx';
import { ShelfStart } from './ShelfStart.tsx';

interface ShelfProps {
  chainId: string;
  /** The board as this shelf shows it. */
  view: BoardViewValue;
}

/** A chain: its batches in order, the cake running from one to the next. */
export const Shelf = memo(function Shelf({ chainId, view }: ShelfProps) {
  const chain = view.index.chain(chainId);
  if (!chain) return null;
  return (
    <BoardPartView view={view}>
      <ShelfRow chain={chain} batches={view.index.batchesOf(chainId)} />
    </BoardPartView>
  );
});

function ShelfRow({ chain, batches }: { chain: Chain; batches: readonly Batch[] }) {
  const headingId = useId();
  const [first] = batches;
  return (
    <section
      aria-labelledby={headingId}
      data-chain={chain.id}
      className="grid grid-cols-[148px_minmax(0,1fr)] pt-3 [contain-intrinsic-size:auto_230px] [content-visibility:auto] print:break-inside-avoid print:[content-visibility:visible]"
    >
      <ShelfLabel chain={chain} headingId={headingId} />
      <ShelfRun label={`Batches on ${chain.name}`}>
        {(!first || first.stage === 'pencilled') && <ShelfStart chain={chain} />}
        {batches.map((batch, place) => (
          <ShelfBatch key={batch.id} batch={batch} next={batches[place + 1]} chainId={chain.id} />
        ))}
      </ShelfRun>
    </section>
  );
}
