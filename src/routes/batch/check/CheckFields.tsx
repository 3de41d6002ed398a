import clsx from 'clsx';
import { useWatch } from 'react-hook-form';
import { FAULTS, LAYERS, CAKE_COLOURS, SMELLS } from '#shared/api/cakeCheck.ts';
import { CheckField } from '../../../components/form/CheckField.tsx';
import { NoteField } from '../../../components/form/NoteField.tsx';
import { QuantityField } from '../../../components/form/QuantityField.tsx';
import { SegmentedField } from '../../../components/form/SegmentedField.tsx';
import type { Amount } from './checkValues.ts';
import { COLOUR_WORDS, FAULT_WORDS, LAYER_WORDS, SMELL_WORDS } from './checkWords.ts';
import { ChipField } from './ChipField.tsx';
import { CountFields } from './CountFields.tsx';
import { FitField } from './FitField.tsx';

interface Values {
  tasted: 'clean' | 'off' | null;
  amount: Amount;
  counted: boolean;
}

/** How a cake is judged, in the order in which it is done: tasted first, signed last. */
export function CheckFields({ signer }: { signer: string }) {
  const { tasted, amount, counted } = useWatch() as Values;
  return (
    <>
      <SegmentedField
        name="tasted"
        label="The beer above it, tasted first"
        options={[
          { value: 'clean', label: 'Clean' },
          { value: 'off', label: 'Off' },
        ]}
      />
      {tasted === 'off' && (
        <ChipField
          name="faults"
          label="What is off"
          take="many"
          chips={FAULTS.map((value) => ({ value, label: FAULT_WORDS[value] }))}
        />
      )}
      <AmountFields amount={amount} />
      <ChipField
        name="layers"
        label="Layers"
        take="one"
        chips={LAYERS.map((value) => ({ value, label: LAYER_WORDS[value] }))}
      />
      <ChipField
        name="colour"
        label="Colour of the cake"
        aside="under the trub line"
        take="one"
        chips={CAKE_COLOURS.map((value) => ({ value, label: <Colour value={value} /> }))}
      />
      <ChipField
        name="smells"
        label="Smell"
        take="many"
        chips={SMELLS.map((value) => ({ value, label: SMELL_WORDS[value] }))}
      />
      <CheckField name="counted" label="Cells were counted" />
      {counted && <CountFields />}
      <FitField signer={signer} />
      <NoteField name="notes" label="Note" rows={2} />
    </>
  );
}

function Colour({ value }: { value: (typeof CAKE_COLOURS)[number] }) {
  const { label, ground } = COLOUR_WORDS[value];
  return (
    <>
      <i
        aria-hidden
        className={clsx('size-5 rounded-[5px] border-[1.5px] border-ink/40', ground)}
      />
      {label}
    </>
  );
}

const WAYS = [
  { value: 'volume', label: 'By volume' },
  { value: 'mass', label: 'By mass' },
  { value: 'weighed', label: 'Vessel' },
];

function AmountFields({ amount }: { amount: Amount }) {
  return (
    <div className="space-y-2">
      <SegmentedField name="amount" label="Cake left" options={WAYS} />
      {amount === 'volume' && <QuantityField name="volumeL" label="Volume of the cake" />}
      {amount === 'mass' && <QuantityField name="massKg" label="Mass of the cake" />}
      {amount === 'weighed' && (
        <div className="grid grid-cols-2 items-start gap-3">
          <QuantityField name="fullKg" label="Vessel with the cake" />
          <QuantityField name="tareKg" label="Vessel empty" />
        </div>
      )}
    </div>
  );
}
