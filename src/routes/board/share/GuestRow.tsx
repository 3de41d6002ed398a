import { useState } from 'react';
import type { ChainGuest } from '#shared/api/guest.ts';
import { useWithdrawGuest } from '../../../api/guests.ts';
import { dayAndTime } from '../../../app/zonedTime.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { guestName } from './guestWords.ts';

function stateWords(guest: ChainGuest, timeZone: string): string {
  if (guest.withdrawnAt !== null) return `ended ${dayAndTime(guest.withdrawnAt, timeZone)}`;
  if (guest.joinedAt !== null) return `since ${dayAndTime(guest.joinedAt, timeZone)}`;
  return `good until ${dayAndTime(guest.expiresAt, timeZone)}`;
}

export function GuestRow({ guest, chainId }: { guest: ChainGuest; chainId: string }) {
  const { slug, board } = useBoardView();
  const withdraw = useWithdrawGuest(slug, chainId);
  const [asking, setAsking] = useState(false);
  const name = guestName(guest);
  return (
    <li className="flex items-center gap-3 py-2.5">
      <div className="min-w-0 grow">
        <p className="font-medium wrap-anywhere">{name}</p>
        <p className="text-small text-ink2">
          As {guest.role} · {stateWords(guest, board.brewery.timeZone)} · invited by{' '}
          {guest.createdBy}
        </p>
      </div>
      {board.me.can.invite && guest.withdrawnAt === null && (
        <Button
          size="small"
          look="quiet"
          aria-label={`Withdraw: ${name}`}
          onClick={() => setAsking(true)}
        >
          Withdraw
        </Button>
      )}
      <ConfirmDialog
        open={asking}
        onClose={() => setAsking(false)}
        title={guest.joinedAt ? `End the access of ${name}?` : 'Withdraw this invitation?'}
        action={guest.joinedAt ? 'End the access' : 'Withdraw the invitation'}
        busy={withdraw.isPending}
        error={withdraw.error}
        onConfirm={() => withdraw.mutate(guest.id, { onSuccess: () => setAsking(false) })}
      >
        <p>The chain leaves their board. What they did to it stays, and stays in the record.</p>
      </ConfirmDialog>
    </li>
  );
}
