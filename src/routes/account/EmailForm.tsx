import { useForm } from 'react-hook-form';
import { emailChange } from '#shared/api/account.ts';
import type { Person } from '#shared/api/people.ts';
import { useChangeEmail } from '../../api/account.ts';
import { contractResolver } from '../../components/form/contractResolver.ts';
import { Form } from '../../components/form/Form.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { SecretField } from './SecretField.tsx';

export function EmailForm({ me }: { me: Person }) {
  const change = useChangeEmail();
  const form = useForm({
    resolver: contractResolver(emailChange),
    defaultValues: { email: me.email, password: '' },
  });
  return (
    <Form
      form={form}
      action="Change the address"
      onSubmit={async (values) => {
        const { email } = await change.mutateAsync({ version: me.version, ...values });
        form.reset({ email, password: '' });
        void say(`You sign in with ${email} from now on.`);
      }}
    >
      <TextField
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
        hint="To sign in with. Nothing is sent to it."
      />
      <SecretField name="password" label="Your password" autoComplete="current-password" />
    </Form>
  );
}
