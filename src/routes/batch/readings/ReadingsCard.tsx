import { Download, Plus } from 'lucide-react';
import { useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import type { BatchRecord, Reading } from '#shared/api/reading.ts';
import { KeptOffline } from '../../../app/keptOffline.ts';
import { lazyPart } from '../../../app/lazyPart.tsx';
import { Button } from '../../../components/ui/Button.tsx';
import { Card, CardTitle } from '../../../components/ui/Card.tsx';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { readingsCsv, saveFile } from './csv.ts';
import { ReadingsTable } from './ReadingsTable.tsx';

/** The form comes when it is asked for. */
const ReadingDialog = lazyPart(async () => (await import('./ReadingDialog.tsx')).ReadingDialog);
const InstrumentsDialog = lazyPart(
  async () => (await import('./InstrumentsDialog.tsx')).InstrumentsDialog,
);

interface ReadingsCardProps {
  batch: Batch;
  record: BatchRecord;
}

/** Every reading of a batch: written down, put right, handed over as a file. */
export function ReadingsCard({ batch, record }: ReadingsCardProps) {
  const { can, mayWriteDown } = useBoardView();
  const [edited, setEdited] = useState<Reading | 'new' | null>(null);
  const { readings, instruments } = record;
  return (
    <Card label="Readings">
      <div className="mb-3 flex flex-wrap items-center gap-3">
        <CardTitle>Readings</CardTitle>
        <span className="grow text-small text-ink2">
          {readings.length > 0 && `${readings.length} in all`}
        </span>
        {can.setStages && <InstrumentsButton batch={batch} record={record} />}
        {mayWriteDown && (
          <Button look="first" size="small" onClick={() => setEdited('new')}>
            <Plus size={16} aria-hidden />
            Log a reading
          </Button>
        )}
        {readings.length > 0 && <ExportButton batch={batch} record={record} />}
      </div>
      {readings.length === 0 ? (
        <p className="text-ink2">
          Nothing is read yet. Two gravities, 48 hours apart, tell that a beer is done.
        </p>
      ) : (
        <ReadingsTable record={record} {...(mayWriteDown && { onEdit: setEdited })} />
      )}
      {edited !== null && (
        <ReadingDialog
          batch={batch}
          reading={edited === 'new' ? null : edited}
          like={readings.at(-1) ?? null}
          instruments={instruments}
          onClose={() => setEdited(null)}
        />
      )}
    </Card>
  );
}

function InstrumentsButton({ batch, record }: ReadingsCardProps) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button look="text" size="small" onClick={() => setOpen(true)}>
        Instruments
      </Button>
      {isOpen && (
        <KeptOffline value={false}>
          <InstrumentsDialog
            batchId={batch.id}
            instruments={record.instruments}
            onClose={() => setOpen(false)}
          />
        </KeptOffline>
      )}
    </>
  );
}

function ExportButton({ batch, record }: ReadingsCardProps) {
  const { timeZone } = useBoardView().board.brewery;
  const hand = (text: string) => saveFile(`${batch.name} readings.csv`, text);
  return (
    <Button
      look="quiet"
      size="small"
      onClick={() =>
        void readingsCsv(record.readings, record.instruments, timeZone).then(hand, () =>
          say('The file could not be made. Try again once the connection is back.'),
        )
      }
    >
      <Download size={16} aria-hidden />
      Export
    </Button>
  );
}
