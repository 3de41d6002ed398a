import { useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { name } from '#shared/api/fields.ts';
import { email, newPassword } from '#shared/api/people.ts';
import { useJoin } from '../../api/join.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { EmailField, EntryField } from '../public/EntryField.tsx';
import { EntryForm } from '../public/EntryForm.tsx';
import { PasswordField } from '../public/PasswordField.tsx';

/** The join request, whose three fields nobody who is not signed in may leave out. */
const contract = z.strictObject({ name, email, password: newPassword });

export function JoinForm({ token }: { token: string }) {
  const navigate = useNavigate();
  const join = useJoin(token);
  return (
    <>
      <EntryForm
        contract={contract}
        action="Join the brewery"
        busyAction="Joining"
        onSubmit={async (values) => {
          const { brewerySlug } = await join.mutateAsync(values);
          await navigate(`/b/${brewerySlug}`, { replace: true });
        }}
      >
        <EntryField name="name" label="Your name" autoComplete="name" />
        <EmailField hint="To sign in with. Nothing is sent to it." />
        <PasswordField
          name="password"
          label="Password"
          autoComplete="new-password"
          hint="At least 10 characters; a short sentence is easiest to keep."
        />
      </EntryForm>
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
