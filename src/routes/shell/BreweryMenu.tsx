import { Check, ChevronDown } from 'lucide-react';
import { useSession } from '../../api/session.ts';
import { guestAddress } from '../../app/guestAddress.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Menu, MenuLabel, MenuLink, MenuSeparator } from '../../components/ui/Menu.tsx';

/** The brewery that is shown, and the way to the others; where there is no room, one's account menu leads there. */
export function BreweryMenu() {
  const { brewerySlug, name } = useBrewery();
  const { data: me } = useSession();
  if (!me) return null;
  return (
    <Menu
      button={{
        'aria-label': `Brewery: ${name}`,
        className:
          'flex min-h-9 min-w-0 items-center gap-1.5 rounded-lg px-2 hover:bg-on-bar/8 max-wide:hidden',
        children: (
          <>
            <span className="truncate">{name}</span>
            <ChevronDown size={16} aria-hidden="true" className="shrink-0" />
          </>
        ),
      }}
    >
      <MenuLabel>Your breweries</MenuLabel>
      {me.breweries.map(({ brewery }) => {
        const isHere = brewery.slug === brewerySlug;
        return (
          <MenuLink
            key={brewery.id}
            to={`/b/${brewery.slug}`}
            {...(isHere && { 'aria-current': 'true' })}
          >
            <span className="min-w-0 grow wrap-anywhere">{brewery.name}</span>
            {isHere && <Check size={18} aria-hidden="true" />}
          </MenuLink>
        );
      })}
      {me.guestOf.length > 0 && <MenuLabel>As a guest</MenuLabel>}
      {me.guestOf.map((place) => (
        <MenuLink key={place.guestId} to={guestAddress(place)}>
          {place.chainName} from {place.fromBrewery}
        </MenuLink>
      ))}
      <MenuSeparator />
      <MenuLink to="/breweries">All breweries, or make another</MenuLink>
    </Menu>
  );
}
