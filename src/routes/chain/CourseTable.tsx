import type { Course, CoursePoint } from '#shared/chain/course.ts';
import { useHiddenEdges } from '../../app/useHiddenEdges.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { cellsOf, COLUMNS } from './courseCells.ts';

/** The figures of the plots, to be read, heard or copied. */
export function CourseTable({ course }: { course: Course }) {
  const scroller = useHiddenEdges();
  return (
    <section className="mt-6 pr-7 max-tablet:pr-0">
      <h2 id="figures" className="text-shelf">
        In figures
      </h2>
      <div
        ref={scroller}
        role="region"
        aria-labelledby="figures"
        // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reached by the keyboard
        tabIndex={0}
        className="goes-on thumb-slim mt-2 overflow-x-auto print:[zoom:0.62]"
      >
        <table className="border-collapse text-small">
          <thead>
            <tr>
              {COLUMNS.map((name) => (
                <th
                  key={name}
                  scope="col"
                  className="max-w-40 min-w-28 border-b border-edge px-2.5 py-1.5 text-left align-bottom font-semibold text-ink2 first:sticky first:left-0 first:bg-stone first:pl-0"
                >
                  {name}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {course.points.map((point) => (
              <Row key={point.batchId} point={point} course={course} />
            ))}
          </tbody>
        </table>
      </div>
    </section>
  );
}

function Row({ point, course }: { point: CoursePoint; course: Course }) {
  const cells = cellsOf(point, course, useBoardView());
  return (
    <tr>
      <th
        scope="row"
        className="sticky left-0 min-w-28 border-b border-line bg-stone py-2 pr-2.5 text-left font-semibold"
      >
        {point.name}
      </th>
      {cells.map((cell, at) => (
        <td key={COLUMNS[at + 1]} className="border-b border-line px-2.5 py-2 whitespace-nowrap">
          {cell ?? <span className="text-ink2">not known</span>}
        </td>
      ))}
    </tr>
  );
}
