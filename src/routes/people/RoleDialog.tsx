import { useState } from 'react';
import type { Member } from '#shared/api/people.ts';
import { useBoard } from '../../api/board.ts';
import { useChangeRole } from '../../api/members.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { DialogFoot } from './DialogFoot.tsx';
import { RoleChoice } from './RoleChoice.tsx';

export interface MemberDialogProps {
  member: Member;
  onClose: () => void;
}

export function RoleDialog({ member, onClose }: MemberDialogProps) {
  const { slug } = useBrewery();
  const isMe = useBoard().me.personId === member.personId;
  const change = useChangeRole(slug);
  const [role, setRole] = useState(member.role);
  const save = () =>
    change.mutate(
      { ...member, role },
      {
        onSuccess: () => {
          onClose();
          void say(
            `${isMe ? 'You are' : `${member.name} is`} ${ROLE_WORDS[role].toLowerCase()} now.`,
          );
        },
      },
    );
  return (
    <Dialog open onClose={onClose} title={isMe ? 'Your role' : `Role of ${member.name}`}>
      <RoleChoice legend={isMe ? 'You are' : 'They are'} role={role} onChoose={setRole} />
      <DialogFoot
        action="Change the role"
        change={change}
        disabled={role === member.role}
        onDo={save}
        onClose={onClose}
      />
    </Dialog>
  );
}
