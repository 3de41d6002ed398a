import { useForm } from 'react-hook-form';
import { Navigate, useNavigate, useSearchParams } from 'react-router-dom';
import { signInRequest } from '#shared/api/people.ts';
import { useSession, useSignIn } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { contractResolver } from '../../components/form/contractResolver.ts';
import { Form } from '../../components/form/Form.tsx';
import { PasswordField } from '../../components/form/PasswordField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { homeOf, safeNext } from '../public/home.ts';
import { PublicForm } from '../public/PublicForm.tsx';

export function SignInPage() {
  useTitle('Sign in');
  const [params] = useSearchParams();
  const next = safeNext(params.get('next'));
  const { data: me } = useSession();
  if (me) return <Navigate to={next ?? homeOf(me)} replace />;
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
  const form = useForm({
    resolver: contractResolver(signInRequest),
    defaultValues: { email: '', password: '' },
  });
  return (
    <Form
      form={form}
      wide
      action="Sign in"
      busyAction="Signing in"
      onSubmit={async (values) => {
        const who = await signIn.mutateAsync(values);
        await navigate(next ?? homeOf(who), { replace: true });
      }}
    >
      <TextField
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        autoCapitalize="none"
        spellCheck={false}
      />
      <PasswordField name="password" label="Password" autoComplete="current-password" />
    </Form>
  );
}
