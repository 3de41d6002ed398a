import { z } from 'zod';

const rate = z.strictObject({ points: z.int().min(1), seconds: z.int().min(1) });
export type Rate = z.infer<typeof rate>;

const limits = z.strictObject({
  /** Wrong passwords for one account from one address. Never by account alone: that would lock its owner out. */
  signInByAccountAndAddress: rate,
  signInByAddress: rate,
  /** Wrong answers to "your password, please" of somebody who is signed in. */
  passwordByPersonAndAddress: rate,
  breweriesByPerson: rate,
  signUpByAddress: rate,
  joinByAddress: rate,
  sharedByAddress: rate,
  clientErrorsByAddress: rate,
  checksByPerson: rate,
  /** Password hashes at work at one time, and those that may wait; more answer 503. */
  hashesAtOnce: z.int().min(1),
  hashesWaiting: z.int().min(0),
  bodyBytes: z.int().min(1024),
});
export type Limits = z.infer<typeof limits>;

export const limitChanges = limits.partial();
export type LimitChanges = z.infer<typeof limitChanges>;

export const LIMITS: Limits = {
  signInByAccountAndAddress: { points: 10, seconds: 900 },
  signInByAddress: { points: 100, seconds: 900 },
  passwordByPersonAndAddress: { points: 10, seconds: 900 },
  breweriesByPerson: { points: 20, seconds: 3600 },
  signUpByAddress: { points: 20, seconds: 3600 },
  joinByAddress: { points: 60, seconds: 900 },
  sharedByAddress: { points: 300, seconds: 900 },
  clientErrorsByAddress: { points: 30, seconds: 600 },
  checksByPerson: { points: 3000, seconds: 60 },
  hashesAtOnce: 2,
  hashesWaiting: 50,
  bodyBytes: 256 * 1024,
};

/** On one machine everybody has the same address: the limits by address alone would meet the wrong person. */
export const LOCAL_LIMITS: LimitChanges = {
  signInByAddress: { points: 2000, seconds: 900 },
  signUpByAddress: { points: 1000, seconds: 3600 },
  joinByAddress: { points: 2000, seconds: 900 },
  sharedByAddress: { points: 5000, seconds: 900 },
};
