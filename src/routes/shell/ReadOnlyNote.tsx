import { useBoard } from '../../api/board.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';

/** Why there are no buttons here. */
export function ReadOnlyNote({ what }: { what: string }) {
  const { role, brewerySlug } = useBrewery();
  const { season } = useBoard();
  if (season.isArchived)
    return (
      <p className="mb-5 text-ink2">
        {season.name} is archived, so nothing is changed from here.{' '}
        <TextLink to={`/b/${brewerySlug}`}>To the current season</TextLink>
      </p>
    );
  return (
    <p className="mb-5 text-ink2">
      You are here as {ROLE_WORDS[role].toLowerCase()}: the head brewer changes the {what}.
    </p>
  );
}
