import { useFormContext, useWatch } from 'react-hook-form';
import type { Instrument, ReadingCreate } from '#shared/api/reading.ts';
import { valueOf, WHY_NOT_REFRACTED } from '#shared/fermentation/correct.ts';
import { readingText } from '#shared/record/readings.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { NoteField } from '../../../components/form/NoteField.tsx';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { SegmentedField } from '../../../components/form/SegmentedField.tsx';
import { SelectField } from '../../../components/form/SelectField.tsx';
import { TimeField } from '../../../components/form/TimeField.tsx';
import type { Written } from '../../../components/form/written.ts';
import { asFigure, unitShown } from './readingValues.ts';

const KINDS = [
  { value: 'gravity', label: 'Gravity' },
  { value: 'temperature', label: 'Temperature' },
  { value: 'ph', label: 'pH' },
];
const METHODS = [
  { value: 'hydrometer', label: 'Hydrometer' },
  { value: 'refractometer', label: 'Refractometer' },
];

interface Values {
  kind: ReadingCreate['kind'];
  method: 'hydrometer' | 'refractometer';
  shown: Written;
  sampleC: Written;
  instrumentId: string | null;
}

const useValues = () => useWatch() as Values;

/** What was read, how and when. */
export function ReadingFields({ instruments }: { instruments: readonly Instrument[] }) {
  const units = useUnits();
  const { setValue, getValues } = useFormContext();
  const values = useValues();
  const { kind, method } = values;
  const isGravity = kind === 'gravity';
  const become = (what: Pick<Values, 'kind' | 'method'>) => {
    setValue('shown', asFigure(getValues('shown') as Written, what, units));
    setValue('instrumentId', null);
  };
  const fitting = instruments.filter((one) => one.kind === kindFor(values) && !one.retired);
  return (
    <>
      <SegmentedField
        name="kind"
        label="What was read"
        options={KINDS}
        onPicked={(next) => become({ kind: next as Values['kind'], method })}
      />
      {isGravity && (
        <SegmentedField
          name="method"
          label="Read by"
          options={METHODS}
          {...(method === 'refractometer' && {
            hint: `Before fermentation only. ${WHY_NOT_REFRACTED}`,
          })}
          onPicked={(next) => become({ kind, method: next as Values['method'] })}
        />
      )}
      <div className="grid grid-cols-2 items-start gap-4 max-tablet:grid-cols-1">
        <QuantityField name="shown" label={LABELS[kind]} unit={unitShown(values)} />
        {isGravity && method === 'hydrometer' && (
          <QuantityField
            name="sampleC"
            label="Sample temperature"
            hint="Empty: at the hydrometer’s own"
          />
        )}
        <TimeField name="takenAt" label="When" />
        {fitting.length > 0 && (
          <SelectField
            name="instrumentId"
            label="Instrument"
            none="No correction"
            options={fitting.map(({ id, name }) => ({ value: id, label: name }))}
          />
        )}
      </div>
      <Corrected instruments={instruments} />
      <NoteField name="notes" label="Note" rows={2} />
    </>
  );
}

const LABELS: Record<Values['kind'], string> = {
  gravity: 'Gravity, as shown',
  temperature: 'Temperature of the beer',
  ph: 'pH, as shown',
};

const kindFor = ({ kind, method }: Values) =>
  kind === 'gravity' ? method : kind === 'ph' ? 'ph-meter' : 'thermometer';

/** What the reading comes to, while it is written. */
function Corrected({ instruments }: { instruments: readonly Instrument[] }) {
  const units = useUnits();
  const { kind, method, shown, sampleC, instrumentId } = useValues();
  const used = instruments.find(({ id }) => id === instrumentId) ?? null;
  const isPlain = used === null && sampleC.value === null && method !== 'refractometer';
  if (shown.value === null || (kind === 'gravity' ? isPlain : used === null)) return null;
  const value = safely(() =>
    valueOf(
      {
        kind,
        method: kind === 'gravity' ? method : null,
        shown: shown.value ?? 0,
        sampleC: method === 'hydrometer' ? sampleC.value : null,
      },
      used,
    ),
  );
  if (value === null) return null;
  return (
    <p role="status" className="rounded-xl bg-bottle-l px-3.5 py-2 text-small">
      Corrected: <b>{readingText({ kind, value }, units)}</b>
      {kind === 'gravity' &&
        (method === 'refractometer'
          ? ' (wort bends light 4 % more than sugar: common practice, ÷ 1.04)'
          : ' (by the density of water at the sample’s temperature)')}
    </p>
  );
}

function safely(work: () => number): number | null {
  try {
    return work();
  } catch (error) {
    if (error instanceof RangeError) return null;
    throw error;
  }
}
