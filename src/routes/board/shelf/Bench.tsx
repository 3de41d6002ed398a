import type { Batch } from '#shared/api/batch.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { BatchActions } from '../batch/BatchActions.tsx';
import { BatchName } from '../batch/BatchName.tsx';
import { Scrapped } from '../batch/Scrapped.tsx';
import { matchesFirst } from '../finding/filter.ts';
import { useIsPale, useMatching } from '../finding/Matching.tsx';
import { GapSlot } from '../lift/GapSlot.tsx';
import { useIsLifted } from '../lift/liftContext.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { beerFacts } from '../view/words.ts';

/** Batches that are on no chain yet, along the foot of the page. */
export function Bench() {
  const { index, can } = useBoardView();
  const matches = useMatching();
  const bench = matches ? matchesFirst(index.bench, ({ id }) => matches.has(id)) : index.bench;
  return (
    <section
      data-room
      data-cover
      aria-labelledby="bench"
      className="sticky print:static bottom-0 z-20 mt-auto flex items-center gap-3 border-t-[3px] border-shelf2 bg-bench px-7 pt-2.5 pb-3"
    >
      <h2 id="bench" className="w-[136px] shrink-0 text-h3 leading-[1.15]">
        On the bench
        <small className="block font-sans text-small font-normal tracking-normal text-ink2">
          {can.moveBatches ? 'lift onto a shelf' : 'without a cake'}
        </small>
      </h2>
      <ul className="thumb-slim flex min-w-0 flex-1 gap-3 overflow-x-auto py-1 print:flex-wrap">
        {bench.map((batch) => (
          <BenchBatch key={batch.id} batch={batch} />
        ))}
        {index.bench.length === 0 && (
          <li className="flex-1 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-2.5 text-small text-ink2">
            Nothing waits here. New batches stay on the bench until they are put on a shelf.
          </li>
        )}
      </ul>
      <Scrapped />
      <div className="pointer-events-none absolute inset-0 lifting:pointer-events-auto">
        <GapSlot gapKey="bench" chainId="bench" afterBatchId={null} vesselShape="bucket" />
      </div>
    </section>
  );
}

function BenchBatch({ batch }: { batch: Batch }) {
  const { units } = useBoardView();
  const { gravity } = beerFacts(batch, units);
  const isLifted = useIsLifted(batch.id);
  return (
    <li
      data-batch={batch.id}
      data-pale={useIsPale(batch.id) || undefined}
      data-in-hand={isLifted || undefined}
      className="flex max-w-[300px] flex-none items-center gap-2.5 rounded-xl border-[1.5px] border-line bg-white py-1.5 pr-2 pl-2.5 text-small text-ink2"
    >
      <Swatch srm={batch.srm} size="glass" />
      <div className="min-w-0">
        <h3 className="font-sans text-body leading-[1.25] font-bold tracking-normal text-ink">
          <BatchName batch={batch} className="block min-h-6 max-w-full truncate" />
        </h3>
        <p className="truncate">{[batch.style, gravity].filter(Boolean).join(' · ')}</p>
      </div>
      <BatchActions batch={batch} />
    </li>
  );
}
