import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { BatchEvent } from '#shared/api/reading.ts';
import { EVENT_WORDS } from '#shared/record/readings.ts';
import { capital } from '#shared/rules/words.ts';
import { formatDay } from '#shared/units/day.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { dayAndTime } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../../components/ui/Card.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';

const EventDialog = lazyPart(async () => (await import('./EventDialog.tsx')).EventDialog);

interface EventsCardProps {
  batch: Batch;
  events: readonly BatchEvent[];
}

/** Dry hops, additions and yeast taken, planned and done. */
export function EventsCard({ batch, events }: EventsCardProps) {
  const { mayWriteDown } = useBoardView();
  const [edited, setEdited] = useState<BatchEvent | 'new' | null>(null);
  return (
    <Card>
      <CardTitle>Done to it</CardTitle>
      {events.length === 0 ? (
        <p className="mt-2 text-ink2">No dry hops, additions or yeast taken are noted.</p>
      ) : (
        <ul className="mt-2 divide-y divide-line2">
          {events.map((event) => (
            <Event
              key={event.id}
              event={event}
              {...(mayWriteDown && { onEdit: () => setEdited(event) })}
            />
          ))}
        </ul>
      )}
      {mayWriteDown && (
        <Button look="quiet" size="small" className="mt-3" onClick={() => setEdited('new')}>
          Add something
        </Button>
      )}
      {edited !== null && (
        <EventDialog
          batch={batch}
          event={edited === 'new' ? null : edited}
          onClose={() => setEdited(null)}
        />
      )}
    </Card>
  );
}

function Event({ event, onEdit }: { event: BatchEvent; onEdit?: () => void }) {
  const { timeZone } = useBoardView().board.brewery;
  const { kind, text, plannedOn, doneAt } = event;
  const when = doneAt
    ? dayAndTime(doneAt, timeZone)
    : plannedOn && `planned for ${formatDay(plannedOn)}`;
  return (
    <li className="flex items-baseline gap-3 py-2">
      <span className="min-w-0 grow wrap-anywhere">
        <b>{capital(EVENT_WORDS[kind])}</b>
        {text && `, ${text}`}
        <span className="block text-small text-ink2">{when}</span>
      </span>
      {onEdit && (
        <Button look="quiet" size="small" onClick={onEdit}>
          {doneAt ? 'Change' : 'Done or change'}
        </Button>
      )}
    </li>
  );
}
