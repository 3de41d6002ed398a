import { Navigate } from 'react-router-dom';
import type { Person } from '#shared/api/people.ts';
import { useSession } from '../../api/session.ts';
import { wayToSignIn } from '../../app/leaving.ts';
import { useLeave } from '../../app/useLeave.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { PublicForm } from '../public/PublicForm.tsx';
import { ChoiceOfBreweries } from './ChoiceOfBreweries.tsx';
import { GuestPlaces } from './GuestPlaces.tsx';
import { MakeBrewery } from './MakeBrewery.tsx';

/** Where somebody with several breweries, or none, chooses one or makes another. */
export function BreweriesPage() {
  useTitle('Your breweries');
  const { data: me, isPending } = useSession();
  if (isPending) return null;
  if (!me) return <Navigate to={wayToSignIn('/breweries')} replace />;
  const hasNone = me.breweries.length === 0;
  return (
    <PublicForm
      title="Your breweries"
      lead={
        hasNone
          ? 'You belong to none at the moment. Make one, or open a join link that somebody passes on to you.'
          : 'This device opens the one that you used last.'
      }
    >
      <ChoiceOfBreweries breweries={me.breweries} />
      <GuestPlaces places={me.guestOf} />
      <MakeBrewery isFirst={hasNone} />
      <Foot me={me} />
    </PublicForm>
  );
}

function Foot({ me }: { me: Person }) {
  const leave = useLeave();
  return (
    <p className="mt-8 flex flex-wrap items-center gap-x-2 border-t border-line pt-4 text-ink2">
      <span className="w-full wrap-anywhere">Signed in as {me.email}</span>
      <TextLink to="/account" className="py-2.5 pr-2 text-ink">
        Account
      </TextLink>
      <Button look="text" onClick={leave}>
        Sign out
      </Button>
    </p>
  );
}
