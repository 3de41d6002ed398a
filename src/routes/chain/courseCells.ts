import type { Course, CoursePoint } from '#shared/chain/course.ts';
import { formatDay } from '#shared/units/day.ts';
import { formatMoney } from '#shared/units/money.ts';
import { format } from '#shared/units/quantity.ts';
import { verdictWord } from '../../components/drawn/verdictWords.ts';
import type { BoardViewValue } from '../board/view/BoardView.tsx';
import { countedFindings, gravityText, shortReason, stageLine } from '../board/view/words.ts';
import { cellsSpan, cellsText, timesText } from './courseWords.ts';

/** What the figures of a batch are called, in their order; the first is its name. */
export const COLUMNS = [
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

/** The figures of a batch in the order of the columns, without its name; null: not known. */
export function cellsOf(
  point: CoursePoint,
  { steps }: Course,
  { board, index, units }: Pick<BoardViewValue, 'board' | 'index' | 'units'>,
): (string | null)[] {
  const batch = index.batch(point.batchId);
  const step = steps.find(({ laterId }) => laterId === point.batchId);
  const { og, fg, alive } = point;
  const known = <T>(value: T | null, say: (value: T) => string) =>
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
    ofCake(
      known(
        alive,
        ({ cells }) =>
          `${cellsText(cells.likely)} (${cellsSpan(cells)})${step?.link.cake.measured ? ', measured' : ''}`,
      ),
    ),
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
