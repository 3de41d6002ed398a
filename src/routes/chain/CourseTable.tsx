import type { Course, CoursePoint } from '#shared/chain/course.ts';
import { formatDay } from '#shared/units/day.ts';
import { formatMoney } from '#shared/units/money.ts';
import { format } from '#shared/units/quantity.ts';
import { verdictWord } from '../../components/drawn/verdictWords.ts';
import { useBoardView } from '../board/view/BoardView.tsx';
import { countedFindings, gravityText, shortReason, stageLine } from '../board/view/words.ts';
import { cellsSpan, cellsText, timesText } from './courseWords.ts';

const COLUMNS = [
  'Batch',
  'Brew day',
  'Stage',
  'Generation',
  'Original gravity',
  'Final gravity',
  'Colour as poured',
  'Bitterness as poured',
  'Living cells in the cake',
  'The wort needs',
  'Times the need',
  'Kept of the cake',
  'Yeast, each batch so far',
  'The link says',
];

/** The figures of the plots, to be read, heard or copied. */
export function CourseTable({ course }: { course: Course }) {
  return (
    <section className="mt-6 pr-7 max-tablet:pr-0">
      <h2 id="figures" className="text-shelf">
        The same in figures
      </h2>
      <div
        role="region"
        aria-labelledby="figures"
        // oxlint-disable-next-line jsx-a11y/no-noninteractive-tabindex -- what scrolls must be reached by the keyboard
        tabIndex={0}
        className="thumb-slim mt-2 overflow-x-auto print:overflow-visible print:[zoom:0.62]"
      >
        <table className="border-collapse text-small">
          <thead>
            <tr>
              {COLUMNS.map((name) => (
                <th
                  key={name}
                  scope="col"
                  className="max-w-28 border-b border-edge px-2.5 py-1.5 text-left align-bottom font-semibold text-ink2 first:sticky first:left-0 first:bg-stone first:pl-0"
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
  const cells = useCells(point, course);
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

/** In the order of the columns; null: not known. */
function useCells(point: CoursePoint, { steps }: Course): (string | null)[] {
  const { board, index, units } = useBoardView();
  const batch = index.batch(point.batchId);
  const step = steps.find(({ laterId }) => laterId === point.batchId);
  const { og, fg, alive } = point;
  const known = <T,>(value: T | null, say: (value: T) => string) =>
    value === null ? null : say(value);
  // On fresh yeast there is no cake, which is no lack of knowledge.
  const ofCake = (text: string | null) => (step ? text : '–');
  const read = (isRead: boolean) => (isRead ? '' : ', planned');
  return [
    known(point.brewOn, formatDay),
    batch ? stageLine(batch, board.today) : null,
    known(point.generation, String),
    known(og, (sg) => gravityText(sg, units) + read(point.isOgRead)),
    known(fg, (sg) => gravityText(sg, units) + read(point.isFgRead)),
    known(point.srm, (srm) => format('colour', srm, units)),
    known(point.ibu, (ibu) => format('bitterness', ibu, units)),
    ofCake(known(alive, ({ cells }) => `${cellsText(cells.likely)} (${cellsSpan(cells)})`)),
    ofCake(known(alive, ({ need }) => cellsText(need))),
    ofCake(
      known(
        alive,
        ({ ratio }) =>
          `${timesText(ratio.likely)} (${timesText(ratio.low)} to ${timesText(ratio.high)})`,
      ),
    ),
    ofCake(
      known(point.keptL, (litres) => {
        const whole = known(point.cakeL, (cakeL) => format('smallVolume', cakeL, units));
        return `${format('smallVolume', litres, units)}${whole ? ` of ${whole}` : ''}`;
      }),
    ),
    known(point.cost, (minor) => formatMoney(minor, board.brewery.currency)),
    step
      ? [verdictWord(step.link.verdict, countedFindings(step.link)), shortReason(step.link, '')]
          .filter(Boolean)
          .join(': ')
      : '–',
  ];
}
