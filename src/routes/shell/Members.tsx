import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '../../api/board.ts';
import { useSession } from '../../api/session.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';

const SHOWN = 4;

/** The others of the team, as they stand on the board. */
export function Members() {
  const { slug } = useBrewery();
  const me = useSession().data?.id;
  const { data: board } = useQuery(boardQuery(slug));
  const others = (board?.members ?? [])
    .map((member, place) => ({ ...member, place }))
    .filter((member) => member.personId !== me);
  if (others.length === 0) return null;
  return (
    <ul aria-label="Others in this brewery" className="flex gap-1.5">
      {others.slice(0, SHOWN).map((member) => (
        <li key={member.personId}>
          <Avatar
            initials={member.initials}
            name={`${member.name}, ${ROLE_WORDS[member.role].toLowerCase()}`}
            place={member.place}
          />
        </li>
      ))}
    </ul>
  );
}
