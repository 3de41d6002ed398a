import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { name } from '#shared/api/fields.ts';
import { useMakeBrewery } from '../../api/breweries.ts';
import { newId } from '../../app/newId.ts';
import { Button } from '../../components/ui/Button.tsx';
import { EntryField } from '../public/EntryField.tsx';
import { EntryForm } from '../public/EntryForm.tsx';

const contract = z.strictObject({ name });

/** @param isFirst the form stands open: there is nothing else to do */
export function MakeBrewery({ isFirst }: { isFirst: boolean }) {
  const [isOpen, setOpen] = useState(isFirst);
  return (
    <section aria-label="Another brewery" className="mt-8">
      {isOpen ? (
        <BreweryForm />
      ) : (
        <Button className="w-full" size="large" onClick={() => setOpen(true)}>
          Make another brewery
        </Button>
      )}
    </section>
  );
}

function BreweryForm() {
  const navigate = useNavigate();
  const make = useMakeBrewery();
  const [id] = useState(newId);
  return (
    <EntryForm
      contract={contract}
      action="Make the brewery"
      busyAction="Setting it up"
      onSubmit={async (values) => {
        const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
        const { brewerySlug } = await make.mutateAsync({ id, ...values, timeZone });
        await navigate(`/b/${brewerySlug}`);
      }}
    >
      <EntryField
        name="name"
        label="Name of the brewery"
        autoComplete="organization"
        hint="You are its head brewer. It has its own yeasts, vessels, seasons and people."
      />
    </EntryForm>
  );
}
