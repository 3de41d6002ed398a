import { z } from 'zod';
import * as f from './fields.ts';
import { theme, unitPrefs } from './units.ts';

export const ROLES = ['head-brewer', 'brewer', 'taster'] as const;
export const role = z.enum(ROLES);
export type Role = z.infer<typeof role>;

export const email = z
  .string()
  .trim()
  .max(254)
  .pipe(z.email('Write an e-mail address, such as mo@saltmarsh.example'));

/** Counted and compared in NFC. */
export const newPassword = z
  .string()
  .normalize('NFC')
  .min(10, 'Use at least 10 characters')
  .max(200, 'Use at most 200 characters');

export const signUpRequest = z.strictObject({
  name: f.name,
  email,
  password: newPassword,
  /** Absent: named after the person. */
  breweryName: f.name.optional(),
  timeZone: z.string().max(60).optional(),
});
export type SignUpRequest = z.infer<typeof signUpRequest>;

export const signInRequest = z.strictObject({
  email: z.string().max(254),
  password: z.string().max(1000).normalize('NFC'),
});
export type SignInRequest = z.infer<typeof signInRequest>;

/** What a member may do; computed by the policies, so that the pages show what is allowed. */
export const abilities = z.strictObject({
  editBatches: z.boolean(),
  moveBatches: z.boolean(),
  /** To another shelf, a new one or the bench. */
  moveAcross: z.boolean(),
  /** Add, brew, rack, scrap and delete batches. */
  setStages: z.boolean(),
  editChains: z.boolean(),
  editYeastsAndVessels: z.boolean(),
  editSeason: z.boolean(),
  acceptHolds: z.boolean(),
  /** Ask people in, change their roles, remove them. */
  invite: z.boolean(),
});
export type Abilities = z.infer<typeof abilities>;

export const membership = z.strictObject({
  brewery: z.strictObject({ id: f.id, slug: f.slug, name: f.name }),
  role,
});
export type Membership = z.infer<typeof membership>;

/** A chain of another brewery, on the board of one of one’s own. */
export const guestPlace = z.strictObject({
  guestId: f.id,
  chainName: f.name,
  fromBrewery: f.name,
  /** Slug of one’s own brewery, on whose board the shelf stands. */
  onBoardOf: f.slug,
});
export type GuestPlace = z.infer<typeof guestPlace>;

export const person = z.strictObject({
  id: f.id,
  version: f.version,
  name: f.name,
  email: z.string(),
  units: unitPrefs,
  theme,
  breweries: z.array(membership),
  guestOf: z.array(guestPlace),
});
export type Person = z.infer<typeof person>;

export const accountPatch = z.strictObject({
  name: f.name.optional(),
  units: unitPrefs.optional(),
  theme: theme.optional(),
});
export type AccountPatch = z.infer<typeof accountPatch>;

export const member = z.strictObject({
  personId: f.id,
  name: f.name,
  initials: z.string().max(3),
  role,
  /** Of the membership: raised when the role changes. */
  version: f.version,
});
export type Member = z.infer<typeof member>;

export const joinLink = z.strictObject({
  id: f.id,
  role,
  createdBy: f.name,
  expiresAt: z.iso.datetime(),
  usedAt: z.iso.datetime().nullable(),
  usedBy: f.name.nullable(),
});
export type JoinLink = z.infer<typeof joinLink>;

export const joinLinkRequest = z.strictObject({ id: f.id, role });
/** The token is in this answer and nowhere else; only its hash is stored. */
export const joinLinkMade = joinLink.extend({ token: z.string() });
export type JoinLinkMade = z.infer<typeof joinLinkMade>;

/** What somebody who holds a join link sees before accepting it. */
export const joinPreview = z.strictObject({
  breweryName: f.name,
  role,
  invitedBy: f.name,
  expiresAt: z.iso.datetime(),
  /** The brewery’s slug, where who asks is signed in and belongs to it already. */
  memberOf: f.slug.nullable(),
});
export type JoinPreview = z.infer<typeof joinPreview>;

/** Nobody signed in: a new account is made. Signed in: the body is empty. */
export const joinRequest = z.strictObject({
  name: f.name.optional(),
  email: email.optional(),
  password: newPassword.optional(),
});
export type JoinRequest = z.infer<typeof joinRequest>;
export const joined = z.strictObject({ person, brewerySlug: f.slug });
export type Joined = z.infer<typeof joined>;
