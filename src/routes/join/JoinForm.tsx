import { useForm } from 'react-hook-form';
import { useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { name } from '#shared/api/fields.ts';
import { email, newPassword } from '#shared/api/people.ts';
import { useJoin } from '../../api/join.ts';
import { contractResolver } from '../../components/form/contractResolver.ts';
import { Form } from '../../components/form/Form.tsx';
import { PasswordField } from '../../components/form/PasswordField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';

/** The join request, whose three fields nobody who is not signed in may leave out. */
const contract = z.strictObject({ name, email, password: newPassword });

export function JoinForm({ token }: { token: string }) {
  const navigate = useNavigate();
  const join = useJoin(token);
  const form = useForm({
    resolver: contractResolver(contract),
    defaultValues: { name: '', email: '', password: '' },
  });
  return (
    <>
      <Form
        form={form}
        wide
        action="Join the brewery"
        busyAction="Joining"
        onSubmit={async (values) => {
          const { brewerySlug } = await join.mutateAsync(values);
          await navigate(`/b/${brewerySlug}`, { replace: true });
        }}
      >
        <TextField name="name" label="Your name" autoComplete="name" />
        <TextField
          name="email"
          label="E-mail"
          type="email"
          autoComplete="username"
          autoCapitalize="none"
          spellCheck={false}
          hint="To sign in with. Nothing is sent to it."
        />
        <PasswordField
          name="password"
          label="Password"
          autoComplete="new-password"
          hint="At least 10 characters; a short sentence is easiest to keep."
        />
      </Form>
      <p className="mt-6 text-touch">
        You have an account?{' '}
        <TextLink
          to={`/sign-in?next=${encodeURIComponent(`/join/${token}`)}`}
          className="inline-block py-2"
        >
          Sign in first
        </TextLink>
      </p>
    </>
  );
}
