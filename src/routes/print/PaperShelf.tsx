import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import { formatDay } from '#shared/units/day.ts';
import { unbroken } from '../../app/unbroken.ts';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { drawnVessel } from '../board/view/drawing.ts';
import { beerFacts, stageLine } from '../board/view/words.ts';
import { PaperVerdict } from './PaperVerdict.tsx';
import { startWords } from './startWords.ts';

/** The batches of a chain on their shelf, four to a row; under each what is said of its pour. */
export function PaperShelf({ chain }: { chain: Chain }) {
  const { index } = useBoardView();
  const batches = index.batchesOf(chain.id);
  if (batches.length === 0) return <p className="mt-1 text-ink2">No batch stands on it yet.</p>;
  return (
    <ol
      aria-label={`Batches on ${chain.name}`}
      className="mt-2 grid grid-cols-4 max-tablet:grid-cols-2"
    >
      {batches.map((batch) => (
        <PaperBatch key={batch.id} batch={batch} chain={chain} />
      ))}
    </ol>
  );
}

function PaperBatch({ batch, chain }: { batch: Batch; chain: Chain }) {
  const { board, index, judged, units } = useBoardView();
  const link = judged.links.get(batch.id);
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <li className="row-span-2 grid break-inside-avoid grid-rows-subgrid gap-y-0">
      <div className="flex items-end gap-1.5 border-b-[5px] border-ink2 pr-1.5">
        <div className="flex-none">
          <Vessel {...drawnVessel(batch, index, judged, board.today)} width={46} />
        </div>
        <div className="min-w-0 pb-1 leading-[1.2]">
          <h3 className="text-[1.08em] font-[680]">{batch.name}</h3>
          {batch.style && <p>{batch.style}</p>}
          <p>{unbroken([gravity, ...rest].join(' · '))}</p>
          <p>{stageLine(batch, board.today)}</p>
        </div>
      </div>
      <div className="pt-1 pr-2 pb-3 leading-[1.25]">
        <p className="font-semibold">{batch.brewOn ? formatDay(batch.brewOn) : 'no date'}</p>
        <p>
          {link ? <PaperVerdict link={link} /> : startWords(chain, index, board.brewery.currency)}
        </p>
      </div>
    </li>
  );
}
