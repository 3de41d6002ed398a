import { useQuery } from '@tanstack/react-query';
import { ChevronDown } from 'lucide-react';
import { placeOf } from '#shared/api/urls.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { seasonsQuery } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { Menu, MenuLabel, MenuLink, MenuSeparator } from '../../../components/ui/Menu.tsx';
import { useBoardView } from '../view/BoardView.tsx';

/**
 * The season that is shown; the others are behind it.
 * @param isBare its name stands beside it already.
 */
export function SeasonSwitch({ isBare = false }: { isBare?: boolean }) {
  const { board } = useBoardView();
  const { path } = useBrewery();
  return (
    <Menu
      align="start"
      button={{
        'aria-label': `Season ${board.season.name}: choose another`,
        className:
          'flex min-h-9 min-w-0 items-center gap-1 rounded-button px-2 text-body font-semibold text-ink2 hover:bg-line2 hover:text-ink max-tablet:min-h-11',
        children: (
          <>
            {!isBare && <span className="truncate">{board.season.name}</span>}
            <ChevronDown size={isBare ? 20 : 15} aria-hidden className="shrink-0" />
          </>
        ),
      }}
    >
      <MenuLabel>Seasons</MenuLabel>
      <Seasons />
      <MenuSeparator />
      <MenuLink to={path('season')}>All seasons, and this one’s days</MenuLink>
    </Menu>
  );
}

/** Asked for when the menu is open. */
function Seasons() {
  const { board } = useBoardView();
  const { slug, brewerySlug } = useBrewery();
  const { data, error } = useQuery(seasonsQuery(slug));
  if (error) return <MenuLabel>{sentenceOf(error)}</MenuLabel>;
  if (!data) return <MenuLabel>Loading them</MenuLabel>;
  return data.map(({ id, name, isCurrent, isArchived }) => (
    <MenuLink
      key={id}
      to={`/b/${placeOf(brewerySlug, isCurrent ? null : id)}`}
      aria-current={id === board.season.id ? 'page' : undefined}
    >
      <span className="min-w-0 wrap-anywhere">{name}</span>
      <span className="ml-auto pl-4 text-small text-ink2">
        {isCurrent ? 'current' : isArchived ? 'archived' : ''}
      </span>
    </MenuLink>
  ));
}
