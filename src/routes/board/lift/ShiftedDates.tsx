import { useBoard } from '../../../api/board.ts';
import { formatDay } from '#shared/units/day.ts';
import type { Change } from './liftState.ts';
import { batchName } from './words.ts';

const dayWords = (day: string | null) => (day === null ? 'no date' : formatDay(day));

/** Each date that the drop shifted, from and to. */
export function ShiftedDates({ shifted }: { shifted: Change['shifted'] }) {
  const board = useBoard();
  if (shifted.length === 0) return <p className="text-small text-ink2">No date was shifted.</p>;
  return (
    <div>
      <h3 className="text-h3">{shifted.length === 1 ? 'Shifted date' : 'Shifted dates'}</h3>
      <dl className="mt-1 divide-y divide-line2">
        {shifted.map(({ batchId, from, to }) => (
          <div key={batchId} className="flex flex-wrap justify-between gap-x-3 py-1.5">
            <dt className="font-semibold [overflow-wrap:anywhere]">{batchName(board, batchId)}</dt>
            <dd className="text-ink2">
              {dayWords(from)}
              <span aria-hidden> → </span>
              <span className="sr-only"> to </span>
              <b className="text-ink">{dayWords(to)}</b>
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
