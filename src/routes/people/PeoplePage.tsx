import { useBoard } from '../../api/board.ts';
import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { ROLE_MEANING, ROLE_WORDS } from '../../app/words.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { JoinLinks } from './JoinLinks.tsx';

export function PeoplePage() {
  useTitle('People');
  const { members, me } = useBoard();
  return (
    <Page>
      <PageHead title="People" lead="Who is in this brewery, and what each may do." />
      <Members members={members} />
      {me.can.invite ? (
        <JoinLinks />
      ) : (
        <p className="mt-6 text-ink2">The head brewer asks new people in.</p>
      )}
    </Page>
  );
}

function Members({ members }: Pick<ReturnType<typeof useBoard>, 'members'>) {
  const mine = useSession().data?.id;
  return (
    <ul className="grid gap-3 tablet:grid-cols-2 wide:grid-cols-3">
      {members.map((member, place) => (
        <li
          key={member.personId}
          className="flex min-w-0 items-center gap-3.5 rounded-card border-[1.5px] border-line bg-paper p-4"
        >
          <span aria-hidden="true">
            <Avatar initials={member.initials} name={member.name} place={place} />
          </span>
          <div className="min-w-0">
            <p className="font-semibold wrap-anywhere">
              {member.name}
              {member.personId === mine && <span className="font-normal text-ink2"> (you)</span>}
            </p>
            <p className="text-small text-ink2">
              <span className="font-medium text-ink">{ROLE_WORDS[member.role]}.</span>{' '}
              {ROLE_MEANING[member.role]}
            </p>
          </div>
        </li>
      ))}
    </ul>
  );
}
