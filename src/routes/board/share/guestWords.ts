import type { ChainGuest, GuestRole } from '#shared/api/guest.ts';

export const GUEST_WORDS: Record<GuestRole, string> = {
  brewer: 'Moves and edits batches within this chain; accepts no hold.',
  taster: 'Sees this chain and changes nothing.',
};

/** "Tam of Estuary Ales", or for whom an invitation waits. */
export const guestName = ({ name, fromBrewery, role }: ChainGuest): string =>
  name === null
    ? `Invitation for a ${role}`
    : fromBrewery === null
      ? name
      : `${name} of ${fromBrewery}`;
