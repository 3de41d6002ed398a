import { useState } from 'react';
import type { JoinLink } from '#shared/api/people.ts';
import { useBoard } from '../../api/board.ts';
import { useWithdrawJoinLink } from '../../api/members.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ROLE_WORDS } from '../../app/words.ts';
import { dayAndTime } from '../../app/zonedTime.ts';
import { Button } from '../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';

export function OpenJoinLink({ link }: { link: JoinLink }) {
  const { slug } = useBrewery();
  const { timeZone } = useBoard().brewery;
  const withdraw = useWithdrawJoinLink(slug);
  const [asking, setAsking] = useState(false);
  const [now] = useState(() => Date.now());
  const ended = Date.parse(link.expiresAt) < now;
  return (
    <li className="flex items-center gap-3">
      <div className="min-w-0 grow">
        <p className="font-medium">For a {ROLE_WORDS[link.role].toLowerCase()}</p>
        <p className="text-small text-ink2">
          Made by {link.createdBy}; {ended ? 'ended' : 'ends'}{' '}
          {dayAndTime(link.expiresAt, timeZone)}
        </p>
      </div>
      <Button size="small" look="quiet" onClick={() => setAsking(true)}>
        Withdraw
      </Button>
      <ConfirmDialog
        open={asking}
        onClose={() => setAsking(false)}
        title="Withdraw this link?"
        action="Withdraw the link"
        busy={withdraw.isPending}
        error={withdraw.error}
        onConfirm={() => withdraw.mutate(link.id, { onSuccess: () => setAsking(false) })}
      >
        <p>Whoever has it can no longer come in with it. Nobody who is already in is affected.</p>
      </ConfirmDialog>
    </li>
  );
}
