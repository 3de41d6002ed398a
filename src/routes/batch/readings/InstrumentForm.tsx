import { useState } from 'react';
import {
  instrument as contract,
  instrumentCreate,
  type Instrument,
  type InstrumentKind,
} from '#shared/api/reading.ts';
import { useInstruments } from '../../../api/batchRecord.ts';
import { newId } from '../../../app/newId.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { RowForm } from '../../../components/form/RowForm.tsx';
import { SelectField } from '../../../components/form/SelectField.tsx';
import { TextField } from '../../../components/form/TextField.tsx';
import { written } from '../../../components/form/written.ts';
import { say } from '../../../components/ui/Toast.tsx';
import { KINDS } from './instrumentKinds.ts';

interface InstrumentFormProps {
  batchId: string;
  instrument: Instrument | null;
  onDone: () => void;
}

/** An instrument is added, or its correction changed. */
export function InstrumentForm({ batchId, instrument, onDone }: InstrumentFormProps) {
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
