import { useQuery } from '@tanstack/react-query';
import type { Chain } from '#shared/api/chain.ts';
import type { Role } from '#shared/api/people.ts';
import { guestsQuery } from '../../../api/guests.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../../app/words.ts';
import { Avatar } from '../../../components/drawn/Avatar.tsx';
import { LinkButton } from '../../../components/ui/LinkButton.tsx';
import { initialsOf } from '../../shell/initials.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';

const DOES: Record<Role, string> = {
  'head-brewer': 'can pour past a hold',
  brewer: 'brews and racks',
  taster: 'reads and comments',
};

/** Who shares this chain, and what each does on it. */
export function WhoIsOn({ chain }: { chain: Chain }) {
  const { board } = useBoardView();
  const { path } = useBrewery();
  return (
    <>
      <h2 className="text-shelf">Who shares this chain</h2>
      <ul className="mt-1">
        {board.members.map(({ personId, name, initials, role }, place) => (
          <li key={personId} className="flex items-center gap-2.5 border-b border-line2 py-2">
            <span aria-hidden>
              <Avatar initials={initials} name={name} place={place} />
            </span>
            <div className="min-w-0 flex-1 leading-tight">
              <b className="wrap-anywhere">{name}</b>
              <p className="text-small text-ink2">{DOES[role]}</p>
            </div>
            <span className="text-small text-ink2">{ROLE_WORDS[role].toLowerCase()}</span>
          </li>
        ))}
        {board.me.can.editChains && <GuestsOn chain={chain} />}
      </ul>
      {board.me.can.invite && (
        <LinkButton to={path('people')} size="small" className="mt-2.5 print:hidden">
          Invite someone
        </LinkButton>
      )}
    </>
  );
}

/** People of other breweries who came by an invitation to this chain alone. */
function GuestsOn({ chain }: { chain: Chain }) {
  const { slug } = useBoardView();
  const { data = [] } = useQuery(guestsQuery(slug, chain.id));
  const here = data.filter(
    ({ joinedAt, withdrawnAt }) => joinedAt !== null && withdrawnAt === null,
  );
  return here.map(({ id, name, fromBrewery, role }, place) => (
    <li key={id} className="flex items-center gap-2.5 border-b border-line2 py-2">
      <span aria-hidden>
        <Avatar initials={initialsOf(name ?? '')} name={name ?? ''} place={place + 3} />
      </span>
      <div className="min-w-0 flex-1 leading-tight">
        <b className="wrap-anywhere">{name ?? 'A guest'}</b>
        <p className="text-small text-ink2">
          {fromBrewery ? `of ${fromBrewery}, this chain alone` : 'this chain alone'}
        </p>
      </div>
      <span className="text-small text-ink2">guest {role}</span>
    </li>
  ));
}
