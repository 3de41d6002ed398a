import { useQuery } from '@tanstack/react-query';
import { seasonOf } from '#shared/api/urls.ts';
import { seasonsQuery } from '../../../api/seasons.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { Notice } from '../../../components/ui/Notice.tsx';
import { TextLink } from '../../../components/ui/TextLink.tsx';
import { useBoardView } from '../view/BoardView.tsx';

/** That a season is put away, or not the one that the brewery works on. */
export function SeasonNote() {
  const { season } = useBoardView().board;
  const { slug, brewerySlug } = useBrewery();
  const isNamed = seasonOf(slug) !== null;
  const { data } = useQuery({ ...seasonsQuery(slug), enabled: isNamed && !season.isArchived });
  const isOther = data?.some(({ id, isCurrent }) => id === season.id && !isCurrent) ?? false;
  if (!season.isArchived && !isOther) return null;
  return (
    <Notice className="mx-7 mt-3 max-tablet:mx-[18px]">
      {season.isArchived
        ? 'This season is archived: it is read, and nothing on it can be changed.'
        : 'This is not the current season.'}{' '}
      <TextLink to={`/b/${brewerySlug}`}>To the current season</TextLink>
    </Notice>
  );
}
