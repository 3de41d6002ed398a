import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { name } from '#shared/api/fields.ts';
import type { Person } from '#shared/api/people.ts';
import { contractResolver } from '../../components/form/contractResolver.ts';
import { Form } from '../../components/form/Form.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { useAccountChange } from './useAccountChange.ts';

const contract = z.strictObject({ name });

export function NameForm({ me }: { me: Person }) {
  const change = useAccountChange(me);
  const form = useForm({
    resolver: contractResolver(contract),
    defaultValues: { name: me.name },
  });
  return (
    <Form
      form={form}
      action="Save"
      onSubmit={async (values) => {
        await change.mutateAsync(values);
        say('Saved.');
      }}
    >
      <TextField
        name="name"
        label="Name"
        autoComplete="name"
        hint="As the others of the brewery see it."
      />
    </Form>
  );
}
