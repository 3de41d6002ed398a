import { useState } from 'react';
import type { GuestShelf } from '#shared/api/guest.ts';
import { useLeaveGuestShelf } from '../../../api/guests.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';

/** The guest goes of their own accord. */
export function LeaveChain({ guest }: { guest: GuestShelf }) {
  const { slug } = useBrewery();
  const leave = useLeaveGuestShelf(slug);
  const [asking, setAsking] = useState(false);
  return (
    <>
      <button
        type="button"
        className="font-medium underline underline-offset-4 max-tablet:min-h-11"
        aria-label={`Leave ${guest.chainName}`}
        onClick={() => setAsking(true)}
      >
        Leave
      </button>
      <ConfirmDialog
        open={asking}
        onClose={() => setAsking(false)}
        title={`Leave ${guest.chainName}?`}
        action="Leave the chain"
        keep="Stay"
        busy={leave.isPending}
        error={leave.error}
        onConfirm={() => leave.mutate(guest.guestId)}
      >
        <p>
          The chain goes off your board. What you did on it stays, and {guest.fromBrewery} can
          invite you again.
        </p>
      </ConfirmDialog>
    </>
  );
}
