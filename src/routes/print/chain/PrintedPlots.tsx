import type { Course } from '#shared/chain/course.ts';
import { Lanes } from '../../chain/ChainPlots.tsx';
import { COLUMN } from '../../chain/columns.ts';
import { batchesAcross, stripsOf } from './strips.ts';

/** How far the plots are drawn smaller to fit across a sheet, by the batches in a row. */
const ZOOM = { 3: 'print:[zoom:0.84]', 4: 'print:[zoom:0.66]' } as const;

/** What changes along the chain, in parts that share their scales. Dashed is planned, solid was read. */
export function PrintedPlots({ course }: { course: Course }) {
  return (
    <section className="mt-4">
      <h2 className="text-[1.3em]">Along the chain</h2>
      <p>Dashed: planned. Solid: as read.</p>
      {stripsOf(course).map((strip) => (
        <div
          key={strip.points[0]?.batchId}
          role="region"
          aria-label={`Plots of ${strip.points.map(({ name }) => name).join(', ')}`}
          // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reached by the keyboard
          tabIndex={0}
          className={`thumb-slim mt-2 overflow-x-auto break-inside-avoid print:overflow-visible ${ZOOM[batchesAcross(course.points.length)]}`}
        >
          <Names course={strip} />
          <Lanes course={strip} whole={course} />
        </div>
      ))}
    </section>
  );
}

function Names({ course: { points } }: { course: Course }) {
  return (
    <p aria-hidden className="flex w-max items-end tablet:pl-[132px]">
      {points.map(({ batchId, name }) => (
        <b
          key={batchId}
          className="flex-none pr-4 pb-1 text-[17px] leading-[1.15]"
          style={{ width: COLUMN.cell }}
        >
          {name}
        </b>
      ))}
    </p>
  );
}
