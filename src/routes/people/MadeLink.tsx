import type { JoinLinkMade } from '#shared/api/people.ts';
import { useBoard } from '../../api/board.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { dayAndTime } from '../../app/zonedTime.ts';
import { LinkOnce } from '../../components/ui/LinkOnce.tsx';

/** The one time that the link can be seen. */
export function MadeLink({ link, onDone }: { link: JoinLinkMade; onDone: () => void }) {
  const { timeZone } = useBoard().brewery;
  return (
    <LinkOnce
      label={`Link for one ${ROLE_WORDS[link.role].toLowerCase()}`}
      address={`${location.origin}/join/${link.token}`}
      onDone={onDone}
    >
      It is shown this once and ends on {dayAndTime(link.expiresAt, timeZone)}. Whoever has it can
      come in, so pass it on with care.
    </LinkOnce>
  );
}
