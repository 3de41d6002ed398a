import { useState } from 'react';
import {
  instrument as contract,
  instrumentCreate,
  type Instrument,
  type InstrumentKind,
} from '#shared/api/reading.ts';
import { format } from '#shared/units/quantity.ts';
import { useInstruments } from '../../../api/batchRecord.ts';
import { newId } from '../../../app/newId.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { RowForm } from '../../../components/form/RowForm.tsx';
import { SelectField } from '../../../components/form/SelectField.tsx';
import { TextField } from '../../../components/form/TextField.tsx';
import { written } from '../../../components/form/written.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { say } from '../../../components/ui/Toast.tsx';

const KINDS: Record<InstrumentKind, { label: string; unit: string }> = {
  hydrometer: { label: 'Hydrometer', unit: 'SG' },
  refractometer: { label: 'Refractometer', unit: '°Bx' },
  thermometer: { label: 'Thermometer', unit: '°C' },
  'ph-meter': { label: 'pH meter', unit: 'pH' },
};

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
  const made = calibratedC === null ? '' : `, made for ${format('temperature', calibratedC, units)}`;
  const by = correction === 0 ? 'no correction' : `${sign}${size} ${KINDS[kind].unit}`;
  return <>{`${KINDS[kind].label}${made}, ${by}${retired ? ', put away' : ''}`}</>;
}

interface InstrumentFormProps {
  batchId: string;
  instrument: Instrument | null;
  onDone: () => void;
}

function InstrumentForm({ batchId, instrument, onDone }: InstrumentFormProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const { add, edit } = useInstruments(slug, batchId);
  const [kind, setKind] = useState<InstrumentKind>(instrument?.kind ?? 'hydrometer');
  const [values] = useState(() => ({
    id: instrument?.id ?? newId(),
    name: instrument?.name ?? '',
    kind: instrument?.kind ?? 'hydrometer',
    correction: written('number', instrument?.correction ?? 0, units, instrument?.typed.correction),
    calibratedC: written(
      'temperature',
      instrument ? instrument.calibratedC : 20,
      units,
      instrument?.typed.calibratedC,
    ),
    notes: instrument?.notes ?? '',
  }));
  return (
    <RowForm
      row={instrument}
      rowSchema={contract}
      contract={instrumentCreate}
      keepsTyped
      values={values}
      shape={(body) => (body.kind === 'hydrometer' ? body : { ...body, calibratedC: null })}
      create={add.mutateAsync}
      patch={({ id, version, patch: { kind: _kind, ...patch } }) =>
        edit.mutateAsync({ id, version, patch })
      }
      labelOf={(key) => key}
      wordsOf={(key, facts) => String(Reflect.get(facts, key) ?? 'nothing')}
      action={instrument ? 'Save' : 'Add the instrument'}
      onCancel={onDone}
      onDone={() => {
        say('The instrument is in the list.');
        onDone();
      }}
    >
      <TextField name="name" label="Name" placeholder="Such as Long glass" autoComplete="off" />
      {instrument === null && (
        <SelectField
          name="kind"
          label="What it is"
          options={Object.entries(KINDS).map(([value, { label }]) => ({ value, label }))}
          onPicked={(value) => setKind((value ?? 'hydrometer') as InstrumentKind)}
        />
      )}
      <div className="grid grid-cols-2 gap-4 max-tablet:grid-cols-1">
        <QuantityField
          name="correction"
          label="Correction"
          unit={KINDS[kind].unit}
          hint="It reads 1.002 in water: write −0.002"
        />
        {kind === 'hydrometer' && <QuantityField name="calibratedC" label="Made for" />}
      </div>
    </RowForm>
  );
}
