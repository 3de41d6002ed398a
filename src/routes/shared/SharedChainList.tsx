import type { Batch } from '#shared/api/batch.ts';
import { CakeRun } from '../../components/drawn/CakeRun.tsx';
import { DateTag } from '../../components/drawn/DateTag.tsx';
import { StageMark } from '../../components/drawn/StageMark.tsx';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { drawnVessel } from '../board/view/drawing.ts';
import { beerFacts, stageLine } from '../board/view/words.ts';
import { SharedLink } from './SharedLink.tsx';

/** Longer than any row is high; what is too much of it is cut off. */
const RUN = 1600;

/** The batches down the page, the cake running from one to the next. */
export function SharedChainList() {
  const { index, board } = useBoardView();
  const [chain] = board.chains;
  const batches = chain ? index.batchesOf(chain.id) : [];
  if (batches.length === 0)
    return <p className="mt-6 text-touch text-ink2">No batch stands on this chain yet.</p>;
  return (
    <ol aria-label="Batches" className="mt-6">
      {batches.map((batch, place) => (
        <SharedBatch key={batch.id} batch={batch} next={batches[place + 1]} />
      ))}
    </ol>
  );
}

function SharedBatch({ batch, next }: { batch: Batch; next: Batch | undefined }) {
  const { index, judged, board } = useBoardView();
  const link = next && judged.links.get(next.id);
  return (
    <li className="relative">
      {link && (
        <div className="absolute top-[90px] -bottom-4 left-[32px] overflow-hidden">
          <CakeRun
            height={RUN}
            verdict={link.verdict}
            hops={link.findings.some((finding) => finding.rule === 'hops-in-cake')}
          />
        </div>
      )}
      <div className="relative flex min-h-[126px] gap-4">
        <div className="relative z-[1] flex w-[84px] shrink-0 flex-col items-center">
          <Vessel {...drawnVessel(batch, index, judged, board.today)} width={60} />
          <span className="mt-1">
            <DateTag day={batch.brewOn} large />
          </span>
        </div>
        <BatchFacts batch={batch} />
      </div>
      {next && link && <SharedLink earlier={batch} later={next} link={link} />}
    </li>
  );
}

function BatchFacts({ batch }: { batch: Batch }) {
  const { board, units } = useBoardView();
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <div className="min-w-0 flex-1 text-touch text-ink2">
      <h2 className="text-h2 leading-[1.15] text-ink wrap-anywhere">{batch.name}</h2>
      {batch.style && <p>{batch.style}</p>}
      <p>
        <b className="text-ink">{gravity}</b> · {rest.join(' · ')}
      </p>
      <p className="flex items-center gap-2">
        <StageMark stage={batch.stage} />
        {stageLine(batch, board.today)}
      </p>
    </div>
  );
}
