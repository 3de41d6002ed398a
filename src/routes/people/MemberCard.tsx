import { Ellipsis } from 'lucide-react';
import { useState } from 'react';
import type { Member } from '#shared/api/people.ts';
import { useBoard } from '../../api/board.ts';
import { ROLE_MEANING, ROLE_WORDS } from '../../app/words.ts';
import { Avatar } from '../../components/drawn/Avatar.tsx';
import { Menu, MenuItem } from '../../components/ui/Menu.tsx';
import { HandOverDialog } from './HandOverDialog.tsx';
import { LeaveBrewery } from './LeaveBrewery.tsx';
import { RemoveMember } from './RemoveMember.tsx';
import { RoleDialog } from './RoleDialog.tsx';

type Asked = 'role' | 'hand-over' | 'remove' | 'leave';

export function MemberCard({ member, place }: { member: Member; place: number }) {
  const { me } = useBoard();
  const isMe = member.personId === me.personId;
  return (
    <li className="flex min-w-0 items-center gap-3.5 rounded-card border-[1.5px] border-line bg-paper p-4">
      <span aria-hidden="true">
        <Avatar initials={member.initials} name={member.name} place={place} />
      </span>
      <div className="min-w-0 grow">
        <p className="font-semibold wrap-anywhere">
          {member.name}
          {isMe && <span className="font-normal text-ink2"> (you)</span>}
        </p>
        <p className="text-small text-ink2">
          <span className="font-medium text-ink">{ROLE_WORDS[member.role]}.</span>{' '}
          {ROLE_MEANING[member.role]}
        </p>
      </div>
      {(me.can.invite || isMe) && <MemberMenu {...{ member, isMe, isHead: me.can.invite }} />}
    </li>
  );
}

interface MemberMenuProps {
  member: Member;
  isMe: boolean;
  /** Who looks is head brewer. */
  isHead: boolean;
}

function MemberMenu({ member, isMe, isHead }: MemberMenuProps) {
  const [asked, setAsked] = useState<Asked | null>(null);
  const dialog = { member, onClose: () => setAsked(null) };
  return (
    <>
      <Menu
        button={{
          'aria-label': isMe ? 'More for you' : `More for ${member.name}`,
          className:
            'grid size-9 shrink-0 place-items-center self-start rounded-lg text-ink2 hover:bg-line2 max-tablet:size-11',
          children: <Ellipsis size={20} aria-hidden="true" />,
        }}
      >
        {isHead && <MenuItem onSelect={() => setAsked('role')}>Change the role</MenuItem>}
        {isHead && !isMe && (
          <>
            <MenuItem onSelect={() => setAsked('hand-over')}>Hand over</MenuItem>
            <MenuItem danger onSelect={() => setAsked('remove')}>
              Remove from the brewery
            </MenuItem>
          </>
        )}
        {isMe && (
          <MenuItem danger onSelect={() => setAsked('leave')}>
            Leave the brewery
          </MenuItem>
        )}
      </Menu>
      {asked === 'role' && <RoleDialog {...dialog} />}
      {asked === 'hand-over' && <HandOverDialog {...dialog} />}
      {asked === 'remove' && <RemoveMember {...dialog} />}
      {asked === 'leave' && <LeaveBrewery {...dialog} />}
    </>
  );
}
