import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { boardQuery } from '../../api/board.ts';
import { useSession } from '../../api/session.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useLeave } from '../../app/useLeave.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';
import { Menu, MenuItem, MenuLabel, MenuLink, MenuSeparator } from '../../components/ui/Menu.tsx';
import { keysStore } from '../../keys/findStore.ts';
import { initialsOf } from './initials.ts';
import { SignOutDialog } from './SignOutDialog.tsx';

export function AccountMenu() {
  const brewery = useBrewery();
  const { data: me } = useSession();
  const { data: board } = useQuery(boardQuery(brewery.slug));
  const { isAsking, stay, ask, leave } = useLeaving();
  if (!me) return null;
  const place = board?.members.findIndex((member) => member.personId === me.id) ?? -1;
  const initials = board?.members[place]?.initials ?? initialsOf(me.name);
  return (
    <>
      <Menu
        button={{
          'aria-label': `Account of ${me.name}`,
          className: 'grid min-h-8 place-items-center rounded-full max-tablet:size-11',
          children: <Avatar initials={initials} name={me.name} place={Math.max(0, place)} />,
        }}
      >
        <MenuLabel>{me.name}</MenuLabel>
        <MenuLink to={brewery.path('account')}>Account and units</MenuLink>
        <MenuLink to={brewery.path('rules')}>House rules</MenuLink>
        <MenuLink to={brewery.path('record')}>Record</MenuLink>
        <MenuLink to="/about/checks">How the checks work</MenuLink>
        <MenuLink to={brewery.path('science')}>The science</MenuLink>
        <MenuItem onSelect={() => keysStore.set(true)}>Keys</MenuItem>
        <MenuLink to="/breweries">Breweries</MenuLink>
        <MenuSeparator />
        <MenuItem onSelect={() => void ask()}>Sign out</MenuItem>
      </Menu>
      {isAsking > 0 && <SignOutDialog waiting={isAsking} onClose={stay} onSignOut={leave} />}
    </>
  );
}

/** Signing out; where something waits to be sent, only after asking. */
function useLeaving() {
  const signOut = useLeave();
  const [isAsking, setAsking] = useState(0);
  const stay = () => setAsking(0);
  const leave = () => {
    stay();
    signOut();
  };
  const ask = async () => {
    const waiting = await waitingHere();
    if (waiting > 0) setAsking(waiting);
    else leave();
  };
  return { isAsking, stay, ask, leave };
}

/** How much of one's own waits to be sent; the outbox itself comes beside the page. */
async function waitingHere(): Promise<number> {
  const { outbox } = await import('../../outbox/outbox.ts');
  await outbox.look();
  return outbox.get().length;
}
