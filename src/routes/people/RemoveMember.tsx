import { useRemoveMember } from '../../api/members.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import type { MemberDialogProps } from './RoleDialog.tsx';

export function RemoveMember({ member, onClose }: MemberDialogProps) {
  const { slug, name } = useBrewery();
  const remove = useRemoveMember(slug);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Remove ${member.name}?`}
      action={`Remove ${member.name}`}
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate(member, {
          onSuccess: () => {
            onClose();
            void say(`${member.name} no longer belongs to ${name}.`);
          },
        })
      }
    >
      <p>
        They stop seeing {name} at once, wherever they have it open. What they did stays in the
        record under their name, and join links that they made end.
      </p>
      <p>To come back they need a new join link.</p>
    </ConfirmDialog>
  );
}
