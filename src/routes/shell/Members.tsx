import { useQuery } from '@tanstack/react-query';
import { boardQuery } from '../../api/board.ts';
import { useSession } from '../../api/session.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { useLive } from '../../live/useLiveSeason.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';

const SHOWN = 4;

/** The others of the team, those who have the season open first. */
export function Members() {
  const { slug } = useBrewery();
  const me = useSession().data?.id;
  const { here } = useLive();
  const { data: board } = useQuery(boardQuery(slug));
  const others = (board?.members ?? [])
    .map((member, place) => ({ ...member, place, isHere: here.includes(member.personId) }))
    .filter((member) => member.personId !== me)
    .toSorted((a, b) => Number(b.isHere) - Number(a.isHere));
  if (others.length === 0) return null;
  return (
    <ul aria-label="Others in this brewery" className="flex gap-1.5">
      {others.slice(0, SHOWN).map((member) => (
        <li key={member.personId}>
          <Avatar
            initials={member.initials}
            name={`${member.name}, ${ROLE_WORDS[member.role].toLowerCase()}${member.isHere ? ', here now' : ''}`}
            place={member.place}
            here={member.isHere}
          />
        </li>
      ))}
    </ul>
  );
}
