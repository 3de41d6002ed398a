import { useQuery } from '@tanstack/react-query';
import { signInsQuery, useEndSignIn } from '../../api/account.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { SignInRow } from './SignInRow.tsx';

/** Where one is signed in, and the way to end it. */
export function SignIns() {
  const { data: places, error } = useQuery(signInsQuery);
  const end = useEndSignIn();
  const online = useOnline();
  if (error) return <Notice kind="hold">{sentenceOf(error)}</Notice>;
  if (!places) return <Skeleton rows={2} label="Looking where you are signed in" />;
  const others = places.filter(({ isThisOne }) => !isThisOne);
  const busy = !online || end.isPending;
  return (
    <>
      <ul className="divide-y divide-line">
        {places.map((place) => (
          <SignInRow
            key={place.mark}
            place={place}
            busy={busy}
            onEnd={() =>
              end.mutate(place.mark, {
                onSuccess: () => void say(`Signed out: ${place.device}.`),
              })
            }
          />
        ))}
      </ul>
      {end.error && (
        <Notice kind="hold" alert className="mt-3">
          {sentenceOf(end.error)}
        </Notice>
      )}
      {others.length > 1 && (
        <Button
          className="mt-4"
          disabled={busy}
          onClick={() =>
            end.mutate(null, { onSuccess: () => void say('Signed out everywhere else.') })
          }
        >
          Sign out everywhere else
        </Button>
      )}
    </>
  );
}
