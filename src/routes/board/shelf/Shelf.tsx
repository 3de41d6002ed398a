import { useId } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { ShelfBatch } from './ShelfBatch.tsx';
import { ShelfLabel } from './ShelfLabel.tsx';
import { ShelfRun } from './ShelfRun.tsx';
import { ShelfStart } from './ShelfStart.tsx';

/** A chain: its batches in order, the cake running from one to the next. */
export function Shelf({ chain }: { chain: Chain }) {
  const { index } = useBoardView();
  const headingId = useId();
  const batches = index.batchesOf(chain.id);
  const [first] = batches;
  return (
    <section
      aria-labelledby={headingId}
      data-chain={chain.id}
      className="grid grid-cols-[148px_minmax(0,1fr)] pt-3 [contain-intrinsic-size:auto_230px] [content-visibility:auto]"
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
