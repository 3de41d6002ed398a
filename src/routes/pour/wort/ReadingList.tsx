import { format } from '#shared/units/quantity.ts';
import { timeOf } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { usePourView } from '../pourView.ts';

/** Every reading, newest first; a slip of the thumb is taken back. */
export function ReadingList() {
  const { run, mine, busy, send } = usePourView();
  const { board, units } = useBoardView();
  if (run.readings.length === 0) return null;
  return (
    <details className="mt-4 max-w-xl">
      <summary className="min-h-11 cursor-pointer py-2.5 font-medium">
        All readings ({run.readings.length})
      </summary>
      <ul className="grid gap-1">
        {run.readings.toReversed().map((reading) => (
          <li key={reading.id} className="flex items-center gap-3 text-touch">
            <span className={reading.withdrawn ? 'text-ink2 line-through' : ''}>
              {timeOf(reading.at, board.brewery.timeZone)} ·{' '}
              {format('temperature', reading.c, units)} · {reading.by.name}
            </span>
            {mine && !reading.withdrawn && run.state === 'open' && (
              <Button
                size="small"
                look="text"
                className="ml-auto"
                disabled={busy}
                aria-label={`Take back ${format('temperature', reading.c, units)}`}
                onClick={() =>
                  void send({
                    kind: 'withdraw',
                    body: { runId: run.id, readingId: reading.id },
                  }).catch(() => undefined)
                }
              >
                Take back
              </Button>
            )}
          </li>
        ))}
      </ul>
    </details>
  );
}
