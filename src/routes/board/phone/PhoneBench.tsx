import type { Batch } from '#shared/api/batch.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { BatchMenu } from '../batch/BatchMenu.tsx';
import { BatchName } from '../batch/BatchName.tsx';
import { Scrapped } from '../batch/Scrapped.tsx';
import { useIsPale } from '../finding/Matching.tsx';
import { MoveMenu } from '../lift/MoveMenu.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { beerFacts, count } from '../view/words.ts';
import { PhoneHead } from './PhoneHead.tsx';

/** Batches without a cake, on a phone. */
export function PhoneBench() {
  const { index } = useBoardView();
  return (
    <>
      <PhoneHead title="On the bench">
        {count(index.bench.length, 'batch', 'batches')} without a cake
      </PhoneHead>
      <ul className="mt-4 grid grid-cols-1 gap-2.5 px-[18px]">
        {index.bench.map((batch) => (
          <BenchRow key={batch.id} batch={batch} />
        ))}
      </ul>
      {index.bench.length === 0 && (
        <p className="mx-[18px] rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
          Nothing waits here. New batches stay on the bench until they are moved to a shelf.
        </p>
      )}
      <div className="mt-5 px-[18px]">
        <Scrapped />
      </div>
    </>
  );
}

function BenchRow({ batch }: { batch: Batch }) {
  const { units, can } = useBoardView();
  const { gravity } = beerFacts(batch, units);
  return (
    <li
      data-batch={batch.id}
      data-pale={useIsPale(batch.id) || undefined}
      className="flex items-center gap-3 rounded-xl border-[1.5px] border-line bg-white py-2 pr-1 pl-3"
    >
      <Swatch srm={batch.srm} size="glass" />
      <div className="min-w-0 flex-1">
        <h2 className="font-sans text-touch leading-tight font-bold tracking-normal">
          <BatchName batch={batch} className="line-clamp-2 min-h-7" />
        </h2>
        <p className="truncate text-small text-ink2">
          {[batch.style, gravity].filter(Boolean).join(' · ')}
        </p>
      </div>
      {can.moveBatches && batch.stage === 'pencilled' && <MoveMenu batchId={batch.id} />}
      {can.editBatches && <BatchMenu batch={batch} />}
    </li>
  );
}
