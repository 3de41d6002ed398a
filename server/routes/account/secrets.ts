import { and, eq, sql } from 'drizzle-orm';
import type { PersonRow, SignedIn } from '../../auth/sessions.ts';
import type { Db } from '../../db/client.ts';
import { person } from '../../db/schema/people.ts';
import { problem } from '../../problems.ts';
import { endOtherSignIns } from '../sign-ins/commands.ts';
import { findByEmail } from './commands.ts';

/** @returns the row as edited, or null where it has another version by now */
export async function changeEmail(
  db: Db,
  who: PersonRow,
  version: number,
  email: string,
): Promise<PersonRow | null> {
  return db.transaction(async (tx) => {
    const known = await findByEmail(tx, email);
    if (known && known.id !== who.id)
      throw problem('already-exists', {
        detail: 'There is another account with this e-mail address: choose a different one',
        errors: [{ detail: 'Another account has this address already', pointer: '/email' }],
      });
    const [edited] = await tx
      .update(person)
      .set({ email, version: sql`${person.version} + 1` })
      .where(and(eq(person.id, who.id), eq(person.version, version)))
      .returning();
    return edited ?? null;
  });
}

/** Whoever signed in with the old password is signed out, wherever it was. */
export async function changePassword(
  db: Db,
  signedIn: SignedIn,
  passwordHash: string,
): Promise<void> {
  await db.transaction(async (tx) => {
    await tx.update(person).set({ passwordHash }).where(eq(person.id, signedIn.person.id));
    await endOtherSignIns(tx, signedIn);
  });
}
