import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { signInRequest } from '#shared/api/people.ts';
import { useSession, useSignIn } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { EmailField } from '../public/EntryField.tsx';
import { EntryForm } from '../public/EntryForm.tsx';
import { PasswordField } from '../public/PasswordField.tsx';
import { firstPageOf, safeNext } from '../public/home.ts';
import { PublicForm } from '../public/PublicForm.tsx';

export function SignInPage() {
  useTitle('Sign in');
  const [params] = useSearchParams();
  const next = safeNext(params.get('next'));
  const { data: me } = useSession();
  if (me) return <Navigate to={next ?? firstPageOf(me)} replace />;
  return (
    <PublicForm title="Sign in" lead="to your brewery's shelf.">
      <SignInForm next={next} />
      <p className="mt-6">
        <TextLink to="/sign-up" className="inline-block py-2 text-touch">
          Start a brewery
        </TextLink>
      </p>
    </PublicForm>
  );
}

function SignInForm({ next }: { next: string | null }) {
  const navigate = useNavigate();
  const signIn = useSignIn();
  return (
    <EntryForm
      contract={signInRequest}
      action="Sign in"
      busyAction="Signing in"
      onSubmit={async (values) => {
        const who = await signIn.mutateAsync(values);
        await navigate(next ?? firstPageOf(who), { replace: true });
      }}
    >
      <EmailField />
      <PasswordField name="password" label="Password" autoComplete="current-password" />
    </EntryForm>
  );
}
