import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { useLeaveBrewery } from '../../api/members.ts';
import { sessionQuery } from '../../api/session.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';
import type { MemberDialogProps } from './RoleDialog.tsx';

export function LeaveBrewery({ member, onClose }: MemberDialogProps) {
  const { slug, name } = useBrewery();
  const client = useQueryClient();
  const navigate = useNavigate();
  const gone = async () => {
    await navigate('/breweries');
    await client.invalidateQueries(sessionQuery);
  };
  const leave = useLeaveBrewery(slug, gone);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Leave ${name}?`}
      action="Leave the brewery"
      keep="Stay"
      busy={leave.isPending}
      error={leave.error}
      onConfirm={() => leave.mutate(member)}
    >
      <p>
        You stop seeing {name}, and chains that stand on its board for you as a guest. What you did
        stays in its record under your name.
      </p>
      <p>To come back you need a join link from a head brewer.</p>
    </ConfirmDialog>
  );
}
