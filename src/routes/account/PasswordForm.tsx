import { useForm } from 'react-hook-form';
import { passwordChange } from '#shared/api/account.ts';
import { useChangePassword } from '../../api/account.ts';
import { contractResolver } from '../../components/form/contractResolver.ts';
import { Form } from '../../components/form/Form.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { SecretField } from './SecretField.tsx';

const EMPTY = { password: '', newPassword: '' };

export function PasswordForm() {
  const change = useChangePassword();
  const form = useForm({ resolver: contractResolver(passwordChange), defaultValues: EMPTY });
  return (
    <Form
      form={form}
      action="Change the password"
      onSubmit={async (values) => {
        await change.mutateAsync(values);
        form.reset(EMPTY);
        void say('Password changed. You are signed out everywhere else.');
      }}
    >
      <SecretField name="password" label="Password now" autoComplete="current-password" />
      <SecretField
        name="newPassword"
        label="New password"
        autoComplete="new-password"
        hint="At least 10 characters; a short sentence is easiest to keep."
      />
    </Form>
  );
}
