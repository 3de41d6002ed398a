import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { signUpRequest } from '#shared/api/people.ts';
import { useSession, useSignUp } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { homeOf, safeNext } from '../public/home.ts';
import { EmailField, EntryField } from '../public/EntryField.tsx';
import { EntryForm } from '../public/EntryForm.tsx';
import { PasswordField } from '../public/PasswordField.tsx';
import { PublicForm } from '../public/PublicForm.tsx';
import { optionalText } from '../public/optionalText.ts';

/** An empty brewery name is left out: the server then names it after the person. */
const contract = signUpRequest.extend({
  breweryName: optionalText(signUpRequest.shape.breweryName),
});

export function SignUpPage() {
  useTitle('Start a brewery');
  const [params] = useSearchParams();
  const next = safeNext(params.get('next'));
  const { data: me } = useSession();
  if (me) return <Navigate to={next ?? homeOf(me)} replace />;
  return (
    <PublicForm
      title="Start a brewery"
      lead="One shelf for your yeasts, your beers and the people you brew with."
    >
      <SignUpForm next={next} />
      <p className="mt-6 text-touch">
        Already in?{' '}
        <TextLink to="/sign-in" className="inline-block py-2">
          Sign in
        </TextLink>
      </p>
    </PublicForm>
  );
}

function SignUpForm({ next }: { next: string | null }) {
  const navigate = useNavigate();
  const signUp = useSignUp();
  return (
    <EntryForm
      contract={contract}
      action="Start a brewery"
      busyAction="Setting it up"
      onSubmit={async (values) => {
        const { timeZone } = Intl.DateTimeFormat().resolvedOptions();
        const who = await signUp.mutateAsync({ ...values, timeZone });
        await navigate(next ?? homeOf(who), { replace: true });
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
      <EntryField
        name="breweryName"
        label="Name of the brewery (optional)"
        autoComplete="organization"
        hint="It can be changed later."
      />
    </EntryForm>
  );
}
