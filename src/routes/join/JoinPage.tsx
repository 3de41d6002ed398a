import { useQuery } from '@tanstack/react-query';
import { Navigate, useParams } from 'react-router-dom';
import { isProblem, sentenceOf } from '../../api/errors.ts';
import { joinQuery } from '../../api/join.ts';
import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { ROLE_MEANING, ROLE_WORDS } from '../../app/words.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { PublicForm } from '../public/PublicForm.tsx';
import { AcceptJoin } from './AcceptJoin.tsx';
import { JoinForm } from './JoinForm.tsx';

export function JoinPage() {
  useTitle('Join a brewery');
  const { token = '' } = useParams();
  const preview = useQuery(joinQuery(token));
  const { data: me, isPending } = useSession();
  if (!token) return <Navigate to="/" replace />;
  if (preview.error) return <NoLongerGood error={preview.error} />;
  if (!preview.data || isPending)
    return (
      <PublicForm title="Join a brewery" lead="Looking at the link.">
        <Skeleton rows={2} />
      </PublicForm>
    );
  const { breweryName, role, invitedBy, memberOf } = preview.data;
  if (memberOf !== null) return <InAlready name={breweryName} slug={memberOf} />;
  return (
    <PublicForm
      title={`Join ${breweryName}`}
      lead={`${invitedBy} asks you in as ${ROLE_WORDS[role].toLowerCase()}. ${ROLE_MEANING[role]}`}
    >
      {me ? <AcceptJoin token={token} me={me} /> : <JoinForm token={token} />}
    </PublicForm>
  );
}

/** The link is not used up by looking at it. */
function InAlready({ name, slug }: { name: string; slug: string }) {
  return (
    <PublicForm
      title={`You are in ${name} already`}
      lead="You keep the role that you have there. The link stays good: pass it on to whom it is for."
    >
      <LinkButton look="first" size="large" to={`/b/${slug}`}>
        To its board
      </LinkButton>
    </PublicForm>
  );
}

function NoLongerGood({ error }: { error: unknown }) {
  const gone = isProblem(error, 'link-used') || isProblem(error, 'not-found');
  return (
    <PublicForm
      title={gone ? 'This link is no longer good' : 'The link could not be read'}
      lead={
        gone
          ? 'It was used, withdrawn or more than seven days old. Ask the head brewer for a new one.'
          : sentenceOf(error)
      }
    >
      <LinkButton to="/">To the front page</LinkButton>
    </PublicForm>
  );
}
