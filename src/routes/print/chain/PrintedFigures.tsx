import type { Course } from '#shared/chain/course.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { cellsOf, COLUMNS } from '../../chain/courseCells.ts';
import { stripsOf } from './strips.ts';

/** The same in figures, a column a batch. */
export function PrintedFigures({ course }: { course: Course }) {
  return (
    <section className="mt-5">
      <h2 className="break-after-avoid text-[1.3em]">The same in figures</h2>
      {stripsOf(course).map((strip) => (
        <Figures key={strip.points[0]?.batchId} strip={strip} />
      ))}
    </section>
  );
}

function Figures({ strip }: { strip: Course }) {
  const view = useBoardView();
  const columns = strip.points.map((point) => cellsOf(point, strip, view));
  const [batch = '', ...figures] = COLUMNS;
  return (
    <table className="mt-1 w-full table-fixed border-collapse break-inside-avoid leading-[1.2]">
      <thead>
        <tr className="align-bottom *:border-b-[1.5px] *:border-ink *:py-1 *:pr-2 *:text-left">
          <th scope="col">{batch}</th>
          {strip.points.map(({ batchId, name }) => (
            <th key={batchId} scope="col">
              {name}
            </th>
          ))}
        </tr>
      </thead>
      <tbody>
        {figures.map((figure, row) => (
          <tr
            key={figure}
            className="align-top *:border-b *:border-line2 *:py-[0.2em] *:pr-2 *:text-left"
          >
            <th scope="row" className="font-normal">
              {figure}
            </th>
            {columns.map((cells, at) => (
              <td key={strip.points[at]?.batchId}>{cells[row] ?? 'not known'}</td>
            ))}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
