import { useNavigate } from 'react-router-dom';
import type { Person } from '#shared/api/people.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useJoin } from '../../api/join.ts';
import { useSignOut } from '../../api/session.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';

/** Somebody is signed in: one press joins. */
export function AcceptJoin({ token, me }: { token: string; me: Person }) {
  const navigate = useNavigate();
  const join = useJoin(token);
  const signOut = useSignOut();
  const online = useOnline();
  const accept = () =>
    join.mutate({}, { onSuccess: ({ brewerySlug }) => navigate(`/b/${brewerySlug}`) });
  return (
    <div className="space-y-4">
      <p>
        You are signed in as <b>{me.name}</b> ({me.email}).
      </p>
      {join.error && (
        <Notice kind="hold" alert>
          {sentenceOf(join.error)}
        </Notice>
      )}
      {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      <Button
        look="first"
        size="large"
        className="w-full"
        disabled={!online || join.isPending}
        onClick={accept}
      >
        Join the brewery
      </Button>
      <Button look="text" onClick={() => signOut.mutate()}>
        That is not me: sign out first
      </Button>
    </div>
  );
}
