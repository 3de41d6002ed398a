import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { isProblem, sentenceOf } from '../../api/errors.ts';
import { invitationQuery } from '../../api/guests.ts';
import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { PublicForm } from '../public/PublicForm.tsx';
import { GUEST_WORDS } from '../board/share/guestWords.ts';
import { AcceptInvitation } from './AcceptInvitation.tsx';

/** Somebody is asked to one chain of another brewery. */
export function GuestPage() {
  useTitle('A chain is shared with you');
  const { token = '' } = useParams();
  const preview = useQuery(invitationQuery(token));
  const { data: me, isPending } = useSession();
  if (preview.error) return <NoLongerGood error={preview.error} />;
  if (!preview.data || isPending)
    return (
      <PublicForm title="A chain is shared with you" lead="Looking at the invitation.">
        <Skeleton rows={2} />
      </PublicForm>
    );
  const { breweryName, chainName, role, invitedBy } = preview.data;
  return (
    <PublicForm
      title={`${chainName}, as a guest`}
      lead={`${invitedBy} of ${breweryName} puts this chain on your own board. As ${role}: ${GUEST_WORDS[role]}`}
    >
      {me ? <AcceptInvitation token={token} me={me} /> : <ComeIn token={token} />}
    </PublicForm>
  );
}

function ComeIn({ token }: { token: string }) {
  const next = encodeURIComponent(`/guest/${token}`);
  return (
    <div className="flex flex-wrap gap-3">
      <LinkButton look="first" size="large" to={`/sign-in?next=${next}`}>
        Sign in
      </LinkButton>
      <LinkButton size="large" to={`/sign-up?next=${next}`}>
        Start a brewery
      </LinkButton>
    </div>
  );
}

function NoLongerGood({ error }: { error: unknown }) {
  const gone = isProblem(error, 'link-used') || isProblem(error, 'not-found');
  return (
    <PublicForm
      title={gone ? 'This invitation is no longer good' : 'The invitation could not be read'}
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
