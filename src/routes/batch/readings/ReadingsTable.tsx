import { Pencil } from 'lucide-react';
import { useState } from 'react';
import type { BatchRecord, Reading } from '#shared/api/reading.ts';
import { readingText } from '#shared/record/readings.ts';
import { formatDay } from '#shared/units/day.ts';
import { format } from '#shared/units/quantity.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { dayOf, timeOf } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';

const AT_FIRST = 12;
const MORE = 200;

interface ReadingsTableProps {
  record: BatchRecord;
  onEdit?: (reading: Reading) => void;
}

/** Newest first. Only so many rows are drawn at once: a probe may have written thousands. */
export function ReadingsTable({ record: { readings, instruments }, onEdit }: ReadingsTableProps) {
  const [shown, setShown] = useState(AT_FIRST);
  const newest = readings.slice(-shown).reverse();
  const left = readings.length - newest.length;
  return (
    <>
      <div className="-mx-2 overflow-x-auto">
        <table className="w-full text-body">
          <thead className="text-left text-small text-ink2">
            <tr>
              <th className="px-2 pb-1 font-semibold">When</th>
              <th className="px-2 pb-1 text-right font-semibold">Reading</th>
              <th className="px-2 pb-1 font-semibold max-tablet:hidden">As shown</th>
              <th className="px-2 pb-1 font-semibold max-tablet:hidden">By</th>
              {onEdit && (
                <th className="w-10 px-2 pb-1">
                  <span className="sr-only">Change</span>
                </th>
              )}
            </tr>
          </thead>
          <tbody>
            {newest.map((reading) => (
              <Row
                key={reading.id}
                reading={reading}
                instrument={instruments.find(({ id }) => id === reading.instrumentId)?.name}
                {...(onEdit && { onEdit })}
              />
            ))}
          </tbody>
        </table>
      </div>
      {left > 0 && (
        <Button
          look="quiet"
          size="small"
          className="mt-3"
          onClick={() => setShown((now) => now + MORE)}
        >
          Show {Math.min(left, MORE)} older of {left}
        </Button>
      )}
    </>
  );
}

interface RowProps {
  reading: Reading;
  instrument: string | undefined;
  onEdit?: (reading: Reading) => void;
}

function Row({ reading, instrument, onEdit }: RowProps) {
  const units = useUnits();
  const { timeZone } = useBoardView().board.brewery;
  const { takenAt, notes, by } = reading;
  return (
    <tr className="border-t border-line2 align-top">
      <td className="px-2 py-1.5">
        <time dateTime={takenAt} className="whitespace-nowrap">
          {formatDay(dayOf(takenAt, timeZone))},{' '}
          <span className="text-ink2">{timeOf(takenAt, timeZone)}</span>
        </time>
        {notes && <p className="max-w-60 text-small wrap-anywhere text-ink2">{notes}</p>}
      </td>
      <td className="px-2 py-1.5 text-right font-bold whitespace-nowrap">
        {readingText(reading, units)}
      </td>
      <td className="px-2 py-1.5 text-small text-ink2 max-tablet:hidden">
        <AsShown reading={reading} instrument={instrument} />
      </td>
      <td className="px-2 py-1.5 text-small text-ink2 max-tablet:hidden">{by.name}</td>
      {onEdit && (
        <td className="px-2 py-0.5 text-right">
          <button
            type="button"
            aria-label={`Change ${readingText(reading, units)} of ${formatDay(dayOf(takenAt, timeZone))}`}
            onClick={() => onEdit(reading)}
            className="grid size-8 place-items-center rounded-md text-ink3 hover:bg-line2 hover:text-ink max-tablet:size-11"
          >
            <Pencil size={16} aria-hidden />
          </button>
        </td>
      )}
    </tr>
  );
}

/** The correction, where there was one: "1.018 at 26 °C, Old glass". */
function AsShown({ reading, instrument }: Pick<RowProps, 'reading' | 'instrument'>) {
  const units = useUnits();
  const { kind, method, shown, sampleC, value } = reading;
  const isCorrected = Math.abs(shown - value) > 1e-9;
  if (!isCorrected && instrument === undefined && sampleC === null) return null;
  const text =
    method === 'refractometer'
      ? `${Math.round(shown * 10) / 10} °Bx`
      : readingText({ kind, value: shown }, units);
  const at = sampleC === null ? '' : ` at ${format('temperature', sampleC, units)}`;
  return <>{[`${text}${at}`, instrument].filter(Boolean).join(', ')}</>;
}
