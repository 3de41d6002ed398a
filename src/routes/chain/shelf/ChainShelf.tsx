import type { Batch } from '#shared/api/batch.ts';
import type { Chain } from '#shared/api/chain.ts';
import type { Course, CourseStep } from '#shared/chain/course.ts';
import { CakeBand } from '../../../components/drawn/CakeBand.tsx';
import { DateTag } from '../../../components/drawn/DateTag.tsx';
import { StageMark } from '../../../components/drawn/StageMark.tsx';
import { Vessel } from '../../../components/drawn/Vessel.tsx';
import { BatchName } from '../../board/batch/BatchName.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { drawnVessel } from '../../board/view/drawing.ts';
import { stageLine } from '../../board/view/words.ts';
import { COLUMN, widthOf } from '../columns.ts';
import { StepPill } from './StepPill.tsx';

const TOP = 118;
const HEIGHT = TOP + 64;

/** The chain's shelf on the columns of the plots: vessels, the cake between them, what each link says. */
export function ChainShelf({ chain, course }: { chain: Chain; course: Course }) {
  const { index } = useBoardView();
  const batches = index.batchesOf(chain.id);
  return (
    <div className="tablet:pl-[132px]">
      <h2 className="sr-only">Batches</h2>
      <div
        className="relative min-w-full"
        style={{ width: widthOf(batches.length), height: HEIGHT }}
      >
        <div
          aria-hidden
          className="shelf-line absolute -left-4 right-0 max-tablet:left-0"
          style={{ top: TOP, height: 10 }}
        />
        <ol aria-label={`Batches on ${chain.name}`} className="flex">
          {batches.map((batch, place) => (
            <ShelfColumn
              key={batch.id}
              batch={batch}
              step={course.steps.find(({ laterId }) => laterId === batches[place + 1]?.id)}
            />
          ))}
        </ol>
      </div>
    </div>
  );
}

function ShelfColumn({ batch, step }: { batch: Batch; step: CourseStep | undefined }) {
  const { index, judged, board } = useBoardView();
  return (
    <li className="relative flex-none" style={{ width: COLUMN.cell, height: HEIGHT }}>
      {step && (
        <div className="absolute z-[1]" style={{ left: COLUMN.vessel / 2, top: TOP - 13 }}>
          <CakeBand
            width={COLUMN.cell}
            verdict={step.link.verdict}
            hops={step.link.findings.some(({ rule }) => rule === 'hops-in-cake')}
          />
        </div>
      )}
      <div
        className="pointer-events-none absolute left-0 z-[2] flex items-end"
        style={{ height: TOP + 2 }}
      >
        <Vessel {...drawnVessel(batch, index, judged, board.today)} width={COLUMN.vessel} />
      </div>
      <div
        className="absolute z-[3] flex flex-col justify-end"
        style={{
          left: COLUMN.vessel + 3,
          width: COLUMN.cell - COLUMN.vessel - 8,
          height: TOP - 20,
        }}
      >
        <h3 className="text-h3 leading-[1.12] font-[680]">
          <BatchName batch={batch} className="line-clamp-2 max-tablet:min-h-8" />
        </h3>
        {batch.style && (
          <p title={batch.style} className="truncate text-small text-ink2">
            {batch.style}
          </p>
        )}
        <p className="mt-1 flex items-center gap-1.5 text-small whitespace-nowrap text-ink2">
          <StageMark stage={batch.stage} />
          {stageLine(batch, board.today)}
        </p>
      </div>
      <div
        className="pointer-events-none absolute left-0 z-[4] text-center"
        style={{ width: COLUMN.vessel, top: TOP + 17 }}
      >
        <DateTag day={batch.brewOn} />
      </div>
      {step && (
        <div className="absolute z-[4]" style={{ left: COLUMN.vessel + 6, top: TOP + 13 }}>
          <StepPill step={step} />
        </div>
      )}
    </li>
  );
}
