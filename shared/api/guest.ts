import { z } from 'zod';
import * as f from './fields.ts';

/** Somebody of another brewery on one chain. A brewer moves and edits in it, a taster looks. */
export const GUEST_ROLES = ['brewer', 'taster'] as const;
export const guestRole = z.enum(GUEST_ROLES);
export type GuestRole = z.infer<typeof guestRole>;

/** A guest, or the invitation that nobody has used yet, as those who keep the chain see it. */
export const chainGuest = z.strictObject({
  id: f.id,
  role: guestRole,
  createdBy: f.name,
  /** End of the invitation; who came in time stays. */
  expiresAt: z.iso.datetime(),
  /** Null: nobody yet. */
  joinedAt: z.iso.datetime().nullable(),
  name: f.name.nullable(),
  fromBrewery: f.name.nullable(),
  withdrawnAt: z.iso.datetime().nullable(),
});
export type ChainGuest = z.infer<typeof chainGuest>;

export const guestRequest = z.strictObject({ id: f.id, role: guestRole });
export type GuestRequest = z.infer<typeof guestRequest>;
/** The token is in this answer and nowhere else; only its hash is stored. */
export const guestMade = chainGuest.extend({ token: z.string() });
export type GuestMade = z.infer<typeof guestMade>;

/** What somebody who holds an invitation to a chain sees before accepting it. */
export const guestPreview = z.strictObject({
  breweryName: f.name,
  chainName: f.name,
  role: guestRole,
  invitedBy: f.name,
  expiresAt: z.iso.datetime(),
});
export type GuestPreview = z.infer<typeof guestPreview>;

/** The brewery, of one's own, on whose board the shelf is to stand. */
export const guestAccept = z.strictObject({ brewerySlug: f.slug });
export type GuestAccept = z.infer<typeof guestAccept>;
export const guestAccepted = z.strictObject({ guestId: f.id, brewerySlug: f.slug });

/** A shelf of another brewery on one's own board; what stands on it is read under `ownerSlug`. */
export const guestShelf = z.strictObject({
  guestId: f.id,
  role: guestRole,
  fromBrewery: f.name,
  ownerSlug: f.slug,
  /** The season of theirs that it stands in. */
  seasonId: f.id,
  chainId: f.id,
  chainName: f.name,
});
export type GuestShelf = z.infer<typeof guestShelf>;
