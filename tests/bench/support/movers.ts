import { randomUUID } from 'node:crypto';
import { hashToken, newToken } from '../../../server/auth/tokens.ts';
import { membership } from '../../../server/db/schema/brewery.ts';
import { session } from '../../../server/db/schema/people.ts';
import { makePerson } from '../../../server/routes/account/commands.ts';
import { cookieOf } from './cookie.ts';
import type { AtWork } from './atWork.ts';

const A_MONTH = 30 * 24 * 60 * 60 * 1000;

/** Brewers of the brewery who are signed in; the cookie of each. */
export async function signInBrewers(at: AtWork, count: number): Promise<string[]> {
  const cookies: string[] = [];
  for (let number = 1; number <= count; number += 1) {
    const token = newToken();
    await at.db.transaction(async (tx) => {
      const { id: personId } = await makePerson(tx, {
        name: `Mover ${number}`,
        email: `mover-${randomUUID()}@reedbed.example`,
        passwordHash: 'no password opens this account',
      });
      await tx.insert(membership).values({ breweryId: at.brewery.id, personId, role: 'brewer' });
      const expiresAt = new Date(Date.now() + A_MONTH);
      await tx.insert(session).values({ tokenHash: hashToken(token), personId, expiresAt });
    });
    cookies.push(cookieOf(at, token));
  }
  return cookies;
}
