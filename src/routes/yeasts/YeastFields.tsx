import { useFormContext, useWatch } from 'react-hook-form';
import { format } from '#shared/units/quantity.ts';
import { useUnits } from '../../app/useUnits.ts';
import { optionsOf, YEAST_KIND_WORDS } from '../../app/traitWords.ts';
import { CheckField } from '../../components/form/CheckField.tsx';
import { NoteField } from '../../components/form/NoteField.tsx';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { SegmentedField } from '../../components/form/SegmentedField.tsx';
import { TextField } from '../../components/form/TextField.tsx';

/** What the checks take where a yeast says nothing (common practice). */
const USUAL = {
  ale: { ferment: [15, 26], pour: [18, 22], never: 38 },
  lager: { ferment: [5, 15], pour: [10, 14], never: 35 },
} as const;

export function YeastFields({ currency }: { currency: string }) {
  const units = useUnits();
  const { control } = useFormContext();
  const kind: unknown = useWatch({ control, name: 'kind' });
  const usual = USUAL[kind === 'lager' ? 'lager' : 'ale'];
  const degrees = (c: number) => format('temperature', c, units);
  const between = ([low, high]: readonly [number, number]) => `${degrees(low)} to ${degrees(high)}`;
  return (
    <>
      <TextField name="name" label="Name" placeholder="Such as Harbour ale" autoComplete="off" />
      <SegmentedField name="kind" label="Kind" options={optionsOf(YEAST_KIND_WORDS)} />
      <CheckField
        name="character"
        label="Marked character"
        hint="One tastes this yeast: spicy, phenolic, very fruity."
      />
      <div className="grid grid-cols-2 gap-x-4 gap-y-4">
        <QuantityField name="fermentMinC" label="Ferments from" />
        <QuantityField name="fermentMaxC" label="Ferments up to" />
        <p className="col-span-2 -mt-3 text-small text-ink2">
          The maker's own range goes first; left empty, {between(usual.ferment)} is taken.
        </p>
        <QuantityField name="pourMinC" label="Poured from" />
        <QuantityField name="pourMaxC" label="Poured up to" />
        <p className="col-span-2 -mt-3 text-small text-ink2">
          Left empty, {between(usual.pour)} is taken (common practice).
        </p>
        <QuantityField
          name="neverAboveC"
          label="Never above"
          hint={`Kills the yeast. Left empty: ${degrees(usual.never)}.`}
        />
        <QuantityField
          name="generationLimit"
          label="Generations at most"
          hint="Left empty: the house rule."
        />
        <QuantityField
          name="attenuation"
          label="Attenuation"
          hint="Gives the usual final gravity."
        />
        <QuantityField name="packPrice" label="Price of a pack" unit={currency} />
      </div>
      <NoteField name="notes" label="Notes" />
    </>
  );
}
