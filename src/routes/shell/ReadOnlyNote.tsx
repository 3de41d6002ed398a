import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';

/** Why there are no buttons here. */
export function ReadOnlyNote({ what }: { what: string }) {
  const { role } = useBrewery();
  return (
    <p className="mb-5 text-ink2">
      You are here as {ROLE_WORDS[role].toLowerCase()}: the head brewer changes the {what}.
    </p>
  );
}
