import clsx from 'clsx';
import type { Batch } from '#shared/api/batch.ts';
import { Swatch } from '../../components/drawn/Swatch.tsx';
import { Card, CardTitle } from '../../components/ui/Card.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { plannedLines, type Line } from './plannedLines.ts';

/** What was planned beside what was read. */
export function PlannedAndRead({ batch }: { batch: Batch }) {
  const { units } = useBoardView();
  return (
    <Card label="Planned and read">
      <CardTitle>Planned and read</CardTitle>
      <table className="mt-1 w-full text-body">
        <thead className="text-right text-small text-ink2">
          <tr>
            <th scope="col">
              <span className="sr-only">Figure</span>
            </th>
            {['Planned', 'Read', 'Apart by'].map((name) => (
              <th key={name} scope="col" className="pb-1 pl-2 font-semibold">
                {name}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {plannedLines(batch, units).map((line) => (
            <Row key={line.label} line={line} />
          ))}
        </tbody>
      </table>
      <p className="mt-2 text-small text-ink2">
        Read figures replace the plan in every verdict. Colour is not read: it is worked out from
        the recipe.
      </p>
    </Card>
  );
}

function Row({ line: { label, planned, read, apart, isFar = false, srm } }: { line: Line }) {
  return (
    <tr className="border-t border-line2">
      <th scope="row" className="py-1.5 text-left font-normal text-ink2">
        {label}
      </th>
      <td className="py-1.5 pl-2 text-right whitespace-nowrap">
        {typeof srm === 'number' && <Swatch srm={srm} />} {planned ?? '–'}
      </td>
      <td className="py-1.5 pl-2 text-right font-bold whitespace-nowrap">{read ?? '–'}</td>
      <td
        className={clsx('py-1.5 pl-2 text-right whitespace-nowrap', isFar && 'font-bold text-mind')}
      >
        {apart}
      </td>
    </tr>
  );
}
