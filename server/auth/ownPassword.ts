import type { Request } from 'express';
import { invalidField } from '../problems.ts';
import type { Services } from '../services.ts';
import type { PersonRow } from './sessions.ts';

/**
 * Asks for the password of somebody who is signed in. Only wrong tries count, by person and address:
 * who found a browser open cannot guess on and on, and locks the owner out nowhere else.
 */
export async function demandOwnPassword(
  { req, passwords, tries }: Services & { req: Request },
  who: PersonRow,
  password: string,
): Promise<void> {
  const from = req.ip ?? '';
  await tries.count('passwordByPersonAndAddress', who.id, from);
  if (!(await passwords.matches(who.passwordHash, password)))
    throw invalidField(
      '/password',
      'This is not your password: write the one that you sign in with',
    );
  await tries.forget('passwordByPersonAndAddress', who.id, from);
}
