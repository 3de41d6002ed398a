import { hash, verify, argon2id } from 'argon2';
import { createQueue } from './queue.ts';

/** OWASP's first recommendation for argon2id with 19 MiB: two passes, one lane. */
const OPTIONS = { type: argon2id, memoryCost: 19_456, timeCost: 2, parallelism: 1 } as const;

/** Passwords are compared in NFC, so that é typed on two keyboards is one é. */
export const hashPassword = (password: string) => hash(password.normalize('NFC'), OPTIONS);

export interface Passwords {
  hash(password: string): Promise<string>;
  /** A null hash (unknown account) costs the same time and is never right. */
  matches(stored: string | null, password: string): Promise<boolean>;
}

/** Hashing costs memory and a core, so only a few are at work and a bounded number wait. */
export async function createPasswords(limits: {
  hashesAtOnce: number;
  hashesWaiting: number;
}): Promise<Passwords> {
  const inTurn = createQueue(limits.hashesAtOnce, limits.hashesWaiting);
  const dummy = await hashPassword('nobody has this password');
  return {
    hash: (password) => inTurn(() => hashPassword(password)),
    matches: (stored, password) =>
      inTurn(async () => {
        const right = await verify(stored ?? dummy, password.normalize('NFC'));
        return right && stored !== null;
      }),
  };
}
