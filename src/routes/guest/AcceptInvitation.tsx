import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { Person } from '#shared/api/people.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useAcceptInvitation } from '../../api/guests.ts';
import { useOnline } from '../../app/useOnline.ts';
import { BreweryChoice } from '../../components/form/BreweryChoice.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';

/** On which of one's boards the shelf is to stand. */
export function AcceptInvitation({ token, me }: { token: string; me: Person }) {
  const own = me.breweries.map(({ brewery }) => brewery);
  const [slug, setSlug] = useState(own[0]?.slug ?? '');
  const accept = useAcceptInvitation(token);
  const online = useOnline();
  const navigate = useNavigate();
  if (own.length === 0)
    return <p>You belong to no brewery, so there is no board on which it could stand.</p>;
  return (
    <div className="space-y-4">
      <p>
        You are signed in as <b>{me.name}</b> ({me.email}).
      </p>
      <BreweryChoice
        breweries={own}
        chosen={slug}
        onChoose={setSlug}
        legend="It stands on the board of"
      />
      {accept.error && (
        <Notice kind="hold" alert>
          {sentenceOf(accept.error)}
        </Notice>
      )}
      {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      <Button
        look="first"
        size="large"
        className="w-full"
        disabled={!online || accept.isPending}
        onClick={() => accept.mutate(slug, { onSuccess: () => void navigate(`/b/${slug}`) })}
      >
        Put it on my board
      </Button>
    </div>
  );
}
