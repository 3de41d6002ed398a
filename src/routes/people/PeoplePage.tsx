import { useBoard } from '../../api/board.ts';
import { useTitle } from '../../app/useTitle.ts';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Page } from '../shell/Page.tsx';
import { JoinLinks } from './JoinLinks.tsx';
import { MemberCard } from './MemberCard.tsx';

export function PeoplePage() {
  useTitle('People');
  const { members, me } = useBoard();
  return (
    <Page>
      <PageHead title="People" lead="Who is in this brewery, and what each may do." />
      <ul aria-label="People" className="grid gap-3 tablet:grid-cols-2 wide:grid-cols-3">
        {members.map((member, place) => (
          <MemberCard key={member.personId} member={member} place={place} />
        ))}
      </ul>
      {me.can.invite ? (
        <JoinLinks />
      ) : (
        <p className="mt-6 text-ink2">
          The head brewer asks new people in, and changes who may do what.
        </p>
      )}
    </Page>
  );
}
