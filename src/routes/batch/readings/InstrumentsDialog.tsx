import { useState } from 'react';
import type { Instrument } from '#shared/api/reading.ts';
import { format } from '#shared/units/quantity.ts';
import { useInstruments } from '../../../api/batchRecord.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { InstrumentForm } from './InstrumentForm.tsx';
import { KINDS } from './instrumentKinds.ts';

interface InstrumentsDialogProps {
  batchId: string;
  instruments: readonly Instrument[];
  onClose: () => void;
}

/** What the brewery reads with, and by how much each is off. */
export function InstrumentsDialog({ batchId, instruments, onClose }: InstrumentsDialogProps) {
  const [edited, setEdited] = useState<Instrument | 'new' | null>(null);
  const back = () => setEdited(null);
  return (
    <Dialog
      open
      onClose={onClose}
      title="Instruments"
      lead="A correction is added to what the instrument shows. Check a hydrometer in plain water at its own temperature: it should read 1.000."
    >
      {edited === null ? (
        <>
          <InstrumentList batchId={batchId} instruments={instruments} onEdit={setEdited} />
          <Button look="first" className="mt-5" onClick={() => setEdited('new')}>
            Add an instrument
          </Button>
        </>
      ) : (
        <InstrumentForm
          batchId={batchId}
          instrument={edited === 'new' ? null : edited}
          onDone={back}
        />
      )}
    </Dialog>
  );
}

interface InstrumentListProps {
  batchId: string;
  instruments: readonly Instrument[];
  onEdit: (instrument: Instrument) => void;
}

function InstrumentList({ batchId, instruments, onEdit }: InstrumentListProps) {
  const { slug } = useBrewery();
  const { edit } = useInstruments(slug, batchId);
  if (instruments.length === 0)
    return <p className="text-ink2">None yet. Readings are taken as they are shown.</p>;
  return (
    <ul className="divide-y divide-line2">
      {instruments.map((one) => (
        <li key={one.id} className="flex flex-wrap items-center gap-x-3 gap-y-1 py-2.5">
          <span className="min-w-0 grow">
            <b>{one.name}</b>
            <span className="block text-small text-ink2">
              <Correction instrument={one} />
            </span>
          </span>
          <Button look="quiet" size="small" onClick={() => onEdit(one)}>
            Change
          </Button>
          <Button
            look="quiet"
            size="small"
            onClick={() =>
              edit.mutate({ id: one.id, version: one.version, patch: { retired: !one.retired } })
            }
          >
            {one.retired ? 'Use again' : 'Put away'}
          </Button>
        </li>
      ))}
    </ul>
  );
}

function Correction({ instrument }: { instrument: Instrument }) {
  const units = useUnits();
  const { kind, correction, calibratedC, retired } = instrument;
  const size = Math.round(Math.abs(correction) * 10_000) / 10_000;
  const sign = correction < 0 ? '−' : '+';
  const made =
    calibratedC === null ? '' : `, made for ${format('temperature', calibratedC, units)}`;
  const by = correction === 0 ? 'no correction' : `${sign}${size} ${KINDS[kind].unit}`;
  return <>{`${KINDS[kind].label}${made}, ${by}${retired ? ', put away' : ''}`}</>;
}
