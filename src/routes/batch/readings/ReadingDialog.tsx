import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { reading as contract, type Reading, type Instrument } from '#shared/api/reading.ts';
import { readingText } from '#shared/record/readings.ts';
import { useReadings, useRecordNow } from '../../../api/batchRecord.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { RowForm } from '../../../components/form/RowForm.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { ReadingFields } from './ReadingFields.tsx';
import { readingContract, readingShape, readingValues, writeOf } from './readingValues.ts';

interface ReadingDialogProps {
  batch: Batch;
  /** Null: a new one. */
  reading: Reading | null;
  /** The newest one, whose way of reading is likely used again. */
  like: Reading | null;
  instruments: readonly Instrument[];
  onClose: () => void;
}

const LABELS: Record<string, string> = {
  kind: 'What was read',
  method: 'Read by',
  shown: 'Reading',
  sampleC: 'Sample temperature',
  takenAt: 'When',
  instrumentId: 'Instrument',
  notes: 'Note',
};

/** A reading is written down, or put right. */
export function ReadingDialog({ batch, reading, like, instruments, onClose }: ReadingDialogProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const { timeZone } = useBoardView().board.brewery;
  const { add, edit } = useReadings(slug, batch.id);
  const recordNow = useRecordNow(slug, batch.id);
  const [deleting, setDeleting] = useState(false);
  const start = like ?? {
    kind: 'gravity' as const,
    method: 'hydrometer' as const,
    instrumentId: null,
  };
  const [values] = useState(() =>
    readingValues(reading, start, { at: new Date().toISOString(), timeZone }, units),
  );
  return (
    <Dialog open onClose={onClose} title={reading ? 'Change the reading' : `Read ${batch.name}`}>
      <RowForm
        row={reading}
        rowSchema={contract}
        contract={readingContract}
        keepsTyped
        values={values}
        shape={readingShape(timeZone)}
        create={add.mutateAsync}
        patch={({ id, version, patch }) => {
          // What was written in the meantime stands, but for the fields changed here.
          const now = recordNow()?.readings.find((one) => one.id === id);
          const base = now ?? reading;
          if (!base) return Promise.resolve();
          return edit.mutateAsync({ id, version, body: { ...writeOf(base), ...patch } });
        }}
        labelOf={(key) => LABELS[key] ?? key}
        wordsOf={(key, facts) => String(Reflect.get(facts, key) ?? 'nothing')}
        action={reading ? 'Save' : 'Write it down'}
        onCancel={onClose}
        onDone={() => {
          say('The reading is written down.');
          onClose();
        }}
        aside={
          <Button look="danger" onClick={() => setDeleting(true)}>
            Delete
          </Button>
        }
      >
        <ReadingFields instruments={instruments} />
      </RowForm>
      {deleting && reading && (
        <DeleteReading
          batch={batch}
          reading={reading}
          onClose={() => setDeleting(false)}
          onDone={onClose}
        />
      )}
    </Dialog>
  );
}

interface DeleteReadingProps {
  batch: Batch;
  reading: Reading;
  onClose: () => void;
  onDone: () => void;
}

function DeleteReading({ batch, reading, onClose, onDone }: DeleteReadingProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const { remove } = useReadings(slug, batch.id);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title="Delete this reading"
      action="Delete"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate(reading, {
          onSuccess: () => {
            say('The reading is deleted.');
            onDone();
          },
        })
      }
    >
      <p>
        {readingText(reading, units)} goes from {batch.name}. The record keeps that it was there.
      </p>
    </ConfirmDialog>
  );
}
