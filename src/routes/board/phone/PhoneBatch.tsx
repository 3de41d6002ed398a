import type { Batch } from '#shared/api/batch.ts';
import { CakeRun } from '../../../components/drawn/CakeRun.tsx';
import { DateTag } from '../../../components/drawn/DateTag.tsx';
import { StageMark } from '../../../components/drawn/StageMark.tsx';
import { Vessel } from '../../../components/drawn/Vessel.tsx';
import { BatchMenu } from '../batch/BatchMenu.tsx';
import { BatchName } from '../batch/BatchName.tsx';
import { useIsPale } from '../finding/Matching.tsx';
import { GapSlot } from '../lift/GapSlot.tsx';
import { useIsLifted } from '../lift/liftContext.ts';
import { LiftHandle } from '../lift/LiftHandle.tsx';
import { MoveButtons } from '../lift/MoveButtons.tsx';
import { MoveMenu } from '../lift/MoveMenu.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { drawnVessel, shapeOf } from '../view/drawing.ts';
import { beerFacts, stageLine } from '../view/words.ts';
import { PhoneLink } from './PhoneLink.tsx';

interface PhoneBatchProps {
  batch: Batch;
  next: Batch | undefined;
}

/** Longer than any row is high; what is too much of it is cut off. */
const RUN = 320;

/** A batch down the page, its cake running on to the next one under it. */
export function PhoneBatch({ batch, next }: PhoneBatchProps) {
  const { index, judged, board } = useBoardView();
  const link = next && judged.links.get(next.id);
  const isLifted = useIsLifted(batch.id);
  return (
    <li
      data-batch={batch.id}
      data-pale={useIsPale(batch.id) || undefined}
      data-in-hand={isLifted || undefined}
      className="relative"
    >
      {link && (
        <div className="absolute top-[80px] -bottom-4 left-[28px] overflow-hidden">
          <CakeRun
            height={RUN}
            verdict={link.verdict}
            hops={link.findings.some((finding) => finding.rule === 'hops-in-cake')}
          />
        </div>
      )}
      <div className="flex min-h-[112px] gap-3">
        <div className="relative z-[1] flex w-[76px] shrink-0 flex-col items-center">
          <Vessel {...drawnVessel(batch, index, judged, board.today)} width={54} />
          <span className="mt-1">
            <DateTag day={batch.brewOn} large />
          </span>
        </div>
        <BatchFacts batch={batch} />
      </div>
      <div className="relative min-h-14">
        {next && link && <PhoneLink earlier={batch} later={next} link={link} />}
        <div
          data-room
          className="pointer-events-none absolute inset-y-0 right-[18px] left-[84px] z-[2] data-lifting:pointer-events-auto"
        >
          <GapSlot
            layout="bar"
            gapKey={`${batch.chainId ?? ''}:${batch.id}`}
            vesselShape={shapeOf(batch, index)}
          />
        </div>
      </div>
    </li>
  );
}

function BatchFacts({ batch }: { batch: Batch }) {
  const { board, units, can } = useBoardView();
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <div className="min-w-0 flex-1 pr-[18px] text-body text-ink2">
      <div className="flex items-start gap-2">
        <div className="min-w-0 flex-1">
          <h2 className="text-[1.1875rem] leading-[1.15] text-ink">
            <BatchName batch={batch} className="line-clamp-3 min-h-7" />
          </h2>
          <p className="truncate">{batch.style}</p>
        </div>
        {can.moveBatches && <MoveButtons batchId={batch.id} />}
      </div>
      <p>
        <b className="text-ink">{gravity}</b> · {rest.join(' · ')}
      </p>
      <div className="flex min-h-11 items-center gap-2">
        <StageMark stage={batch.stage} />
        <span className="min-w-0 flex-1">{stageLine(batch, board.today)}</span>
        {can.moveBatches && batch.stage === 'pencilled' && (
          <>
            <LiftHandle batchId={batch.id} />
            <MoveMenu batchId={batch.id} />
          </>
        )}
        {can.editBatches && <BatchMenu batch={batch} />}
      </div>
    </div>
  );
}
