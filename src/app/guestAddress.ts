import type { GuestPlace } from '#shared/api/people.ts';

/** The part of a board on which a chain of another brewery stands. */
export const guestAnchor = (guestId: string) => `guest-${guestId}`;

export const guestAddress = ({ guestId, onBoardOf }: GuestPlace) =>
  `/b/${onBoardOf}#${guestAnchor(guestId)}`;
