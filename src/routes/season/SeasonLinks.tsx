import { useBrewery } from '../../app/useBrewery.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';

/** The way to what belongs to a season and has a page of its own. */
export function SeasonLinks() {
  const { path } = useBrewery();
  return (
    <>
      <LinkButton look="quiet" to={path('rules')}>
        House rules
      </LinkButton>
      <LinkButton look="quiet" to={path('record')}>
        Record
      </LinkButton>
    </>
  );
}
