import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { batchEvent, eventCreate, EVENT_KINDS, type BatchEvent } from '#shared/api/reading.ts';
import { EVENT_WORDS } from '#shared/record/readings.ts';
import { capital } from '#shared/rules/words.ts';
import { useEvents, useRecordNow } from '../../../api/batchRecord.ts';
import { newId } from '../../../app/newId.ts';
import { fromLocal, toLocal } from '../../../app/zonedTime.ts';
import { DayField } from '../../../components/form/DayField.tsx';
import { RowForm } from '../../../components/form/RowForm.tsx';
import { SelectField } from '../../../components/form/SelectField.tsx';
import { TextField } from '../../../components/form/TextField.tsx';
import { TimeField } from '../../../components/form/TimeField.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';

interface EventDialogProps {
  batch: Batch;
  event: BatchEvent | null;
  onClose: () => void;
}

const LABELS: Record<string, string> = {
  kind: 'What',
  text: 'How much',
  plannedOn: 'Planned for',
  doneAt: 'Done',
};

/** Dry hops, an addition or the yeast taken: planned for a day, or noted as done. */
export function EventDialog({ batch, event, onClose }: EventDialogProps) {
  const { slug, board } = useBoardView();
  const { timeZone } = board.brewery;
  const { add, edit } = useEvents(slug, batch.id);
  const recordNow = useRecordNow(slug, batch.id);
  const [deleting, setDeleting] = useState(false);
  const [values] = useState(() => ({
    id: event?.id ?? newId(),
    kind: event?.kind ?? 'dry-hop',
    text: event?.text ?? '',
    plannedOn: event?.plannedOn ?? null,
    doneAt: event?.doneAt ? toLocal(event.doneAt, timeZone) : null,
  }));
  return (
    <Dialog
      open
      onClose={onClose}
      title={event ? 'Change what was done' : `Something done to ${batch.name}`}
      lead="Take the yeast for the next beer before the dry hops go in."
    >
      <RowForm
        row={event}
        rowSchema={batchEvent}
        contract={eventCreate}
        keepsTyped={false}
        values={values}
        shape={(body) => ({
          ...body,
          doneAt: typeof body.doneAt === 'string' ? fromLocal(body.doneAt, timeZone) : null,
        })}
        create={add.mutateAsync}
        patch={async ({ id, version, patch }) => {
          const now = recordNow()?.events.find((one) => one.id === id);
          const base = now ?? event;
          if (!base) return;
          const { kind, text, plannedOn, doneAt } = base;
          await edit.mutateAsync({
            id,
            version,
            body: { kind, text, plannedOn, doneAt, ...patch },
          });
        }}
        labelOf={(key) => LABELS[key] ?? key}
        wordsOf={(key, facts) => String(Reflect.get(facts, key) ?? 'nothing')}
        action={event ? 'Save' : 'Write it down'}
        onCancel={onClose}
        onDone={onClose}
        aside={
          <Button look="danger" onClick={() => setDeleting(true)}>
            Delete
          </Button>
        }
      >
        <SelectField
          name="kind"
          label="What"
          options={EVENT_KINDS.map((value) => ({ value, label: capital(EVENT_WORDS[value]) }))}
        />
        <TextField name="text" label="What and how much" placeholder="Such as 46 g, in a bag" />
        <div className="grid grid-cols-2 gap-4 max-tablet:grid-cols-1">
          <DayField name="plannedOn" label="Planned for" />
          <TimeField name="doneAt" label="Done" hint="Empty: still to do" />
        </div>
      </RowForm>
      {deleting && event && (
        <DeleteEvent
          batch={batch}
          event={event}
          onClose={() => setDeleting(false)}
          onDone={onClose}
        />
      )}
    </Dialog>
  );
}

interface DeleteEventProps {
  batch: Batch;
  event: BatchEvent;
  onClose: () => void;
  onDone: () => void;
}

function DeleteEvent({ batch, event, onClose, onDone }: DeleteEventProps) {
  const { slug } = useBoardView();
  const { remove } = useEvents(slug, batch.id);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title="Delete what was done"
      action="Delete"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() => remove.mutate(event, { onSuccess: onDone })}
    >
      <p>
        {capital(EVENT_WORDS[event.kind])}
        {event.text && `, ${event.text}`} goes from {batch.name}. The record keeps that it was
        there.
      </p>
    </ConfirmDialog>
  );
}
