import { useMemo, useState } from 'react';
import { z } from 'zod';
import { brewery as breweryContract, breweryPatch, type Brewery } from '#shared/api/brewery.ts';
import { id, name } from '#shared/api/fields.ts';
import { useBreweryPatch } from '../../api/brewery.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { SelectField } from '../../components/form/SelectField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { currencies, timeZones } from './places.ts';

const contract = z.strictObject({
  id,
  name,
  timeZone: breweryPatch.shape.timeZone.unwrap(),
  currency: breweryPatch.shape.currency.unwrap(),
});

const LABELS: Record<string, string> = {
  name: 'Name of the brewery',
  timeZone: 'Time zone',
  currency: 'Currency',
};

export function BreweryForm({ brewery }: { brewery: Brewery }) {
  const [generation, setGeneration] = useState(0);
  // A saved form starts afresh from the row as it is then.
  return <Fields key={generation} brewery={brewery} onDone={() => setGeneration(generation + 1)} />;
}

function Fields({ brewery, onDone }: { brewery: Brewery; onDone: () => void }) {
  const { slug } = useBrewery();
  const patch = useBreweryPatch(slug);
  const values = useMemo(
    () => ({
      id: brewery.id,
      name: brewery.name,
      timeZone: brewery.timeZone,
      currency: brewery.currency,
    }),
    [brewery],
  );
  return (
    <RowForm
      row={brewery}
      rowSchema={breweryContract}
      contract={contract}
      keepsTyped={false}
      values={values}
      create={() => Promise.resolve()}
      patch={({ version, patch: changes }) => patch.mutateAsync({ version, patch: changes })}
      labelOf={(key) => LABELS[key] ?? key}
      wordsOf={(key, facts) => String(facts[key as keyof typeof facts] ?? '')}
      action="Save"
      follows
      onDone={() => {
        say('Saved.');
        onDone();
      }}
    >
      <TextField name="name" label="Name of the brewery" autoComplete="organization" />
      <SelectField
        name="timeZone"
        label="Time zone"
        options={timeZones(brewery.timeZone)}
        hint="Where today is."
      />
      <SelectField
        name="currency"
        label="Currency"
        options={currencies(brewery.currency)}
        hint="Of pack prices. Amounts are not converted."
      />
    </RowForm>
  );
}
