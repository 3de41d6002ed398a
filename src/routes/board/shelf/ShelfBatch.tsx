import type { Batch } from '#shared/api/batch.ts';
import { CakeBand } from '../../../components/drawn/CakeBand.tsx';
import { DateTag } from '../../../components/drawn/DateTag.tsx';
import { Vessel } from '../../../components/drawn/Vessel.tsx';
import { useIsPale } from '../finding/Matching.tsx';
import { GapSlot } from '../lift/GapSlot.tsx';
import { useIsLifted } from '../lift/liftContext.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { drawnVessel, SHELF, shapeOf } from '../view/drawing.ts';
import { beerFacts } from '../view/words.ts';
import { BatchText } from './BatchText.tsx';
import { ShelfLink } from './ShelfLink.tsx';

interface ShelfBatchProps {
  batch: Batch;
  /** The batch that is poured onto this one's cake here. */
  next: Batch | undefined;
  chainId: string;
}

/** One batch on its shelf. The text beside the vessel gives way to a gap while a batch is lifted. */
export function ShelfBatch({ batch, next, chainId }: ShelfBatchProps) {
  const { index, judged, board } = useBoardView();
  const link = next && judged.links.get(next.id);
  const isLifted = useIsLifted(batch.id);
  return (
    <li
      data-batch={batch.id}
      data-pale={useIsPale(batch.id) || undefined}
      data-in-hand={isLifted || undefined}
      data-room
      className="relative flex-none"
      style={{ width: SHELF.cell, height: SHELF.top + SHELF.board + SHELF.foot }}
    >
      {link && (
        <div className="absolute z-[1]" style={{ left: SHELF.vessel / 2, top: SHELF.top - 13 }}>
          <CakeBand
            width={SHELF.cell}
            verdict={link.verdict}
            hops={link.findings.some((finding) => finding.rule === 'hops-in-cake')}
          />
        </div>
      )}
      <div
        className="pointer-events-none absolute left-0 z-[2] flex items-end"
        style={{ height: SHELF.top + 2 }}
      >
        <Vessel {...drawnVessel(batch, index, judged, board.today)} width={SHELF.vessel} />
      </div>
      <div
        className="lift-fade absolute z-[3] flex flex-col justify-end *:shrink-0"
        style={{ left: SHELF.vessel + 3, width: SHELF.gap - 4, top: 0, height: SHELF.top - 18 }}
      >
        <BatchText batch={batch} />
      </div>
      <Foot batch={batch} />
      {next && link && (
        <div
          className="lift-fade absolute z-[4]"
          style={{ left: SHELF.vessel + 2, top: SHELF.top + 14 }}
        >
          <ShelfLink earlier={batch} later={next} link={link} />
        </div>
      )}
      <div
        className="pointer-events-none absolute inset-y-0 z-[5] lifting:pointer-events-auto"
        style={{ left: SHELF.vessel, width: SHELF.gap }}
      >
        <GapSlot
          gapKey={`${chainId}:${batch.id}`}
          chainId={chainId}
          afterBatchId={batch.id}
          vesselShape={shapeOf(batch, index)}
        />
      </div>
    </li>
  );
}

/** The date on the shelf's edge; while a batch is lifted, the name stands under it. */
function Foot({ batch }: { batch: Batch }) {
  const { units } = useBoardView();
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <div
      className="pointer-events-none absolute left-0 z-[6] flex flex-col items-center text-center"
      style={{ width: SHELF.vessel, top: SHELF.top + SHELF.board + 7 }}
    >
      <DateTag day={batch.brewOn} />
      <div
        aria-hidden
        className="lift-show mt-1 w-[96px] text-[0.8125rem] leading-[1.2] tracking-[-0.015em] text-ink2"
      >
        <b className="line-clamp-2 text-ink">{batch.name}</b>
        {gravity} · {rest[0]}
      </div>
    </div>
  );
}
