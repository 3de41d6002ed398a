import { z } from 'zod';
import * as f from './fields.ts';
import { email, newPassword } from './people.ts';

/** The password that somebody has now, asked again before what cannot be taken back. */
const ownPassword = z
  .string()
  .min(1, 'Write the password that you sign in with')
  .max(1000)
  .normalize('NFC');

export const emailChange = z.strictObject({ email, password: ownPassword });
export type EmailChange = z.infer<typeof emailChange>;

export const passwordChange = z.strictObject({ password: ownPassword, newPassword });
export type PasswordChange = z.infer<typeof passwordChange>;

/** One place where somebody is signed in. */
export const signInPlace = z.strictObject({
  /** Names it, and opens nothing. */
  mark: z.string().max(60),
  /** In plain words: "Firefox on Linux". */
  device: z.string().max(60),
  since: z.iso.datetime(),
  /** To within ten minutes. */
  seenAt: z.iso.datetime(),
  isThisOne: z.boolean(),
});
export type SignInPlace = z.infer<typeof signInPlace>;

/** What goes with a brewery that nobody else belongs to. */
export const breweryLoss = z.strictObject({
  id: f.id,
  name: f.name,
  seasons: z.number().int().min(0),
  chains: z.number().int().min(0),
  batches: z.number().int().min(0),
  yeasts: z.number().int().min(0),
  vessels: z.number().int().min(0),
  comments: z.number().int().min(0),
  /** People of other breweries on its chains, and links to them. */
  shared: z.number().int().min(0),
});
export type BreweryLoss = z.infer<typeof breweryLoss>;

/** What closing the account would do now. */
export const closingPreview = z.strictObject({
  goes: z.array(breweryLoss),
  stays: z.array(z.strictObject({ slug: f.slug, name: f.name })),
  /** The only head brewer among others: somebody else must be made one first. */
  heldBy: z.array(z.strictObject({ slug: f.slug, name: f.name })),
});
export type ClosingPreview = z.infer<typeof closingPreview>;

export const accountClosing = z.strictObject({
  password: ownPassword,
  /** Ids of the breweries that go, as they were shown: others would be refused. */
  losing: z.array(f.id).max(200),
});
export type AccountClosing = z.infer<typeof accountClosing>;

/** Rows by table, as they are stored, without secrets. */
export const accountData = z.strictObject({
  account: z.strictObject({ name: f.name, email: z.string() }),
  breweries: z.array(z.record(z.string(), z.array(z.unknown()))),
});
export type AccountData = z.infer<typeof accountData>;
