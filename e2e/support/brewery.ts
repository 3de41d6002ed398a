import { randomBytes, randomUUID } from 'node:crypto';
import { inArray } from 'drizzle-orm';
import type { Role } from '#shared/api/people.ts';
import { hashToken, newToken } from '../../server/auth/tokens.ts';
import type { Db, Tx } from '../../server/db/client.ts';
import { brewery, membership } from '../../server/db/schema/brewery.ts';
import { person, session } from '../../server/db/schema/people.ts';
import { makeBrewery, makePerson } from '../../server/routes/account/commands.ts';

export interface Member {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  /** What the cookie holds. */
  readonly token: string;
}

export interface TestBrewery {
  readonly id: string;
  readonly slug: string;
  readonly seasonId: string;
  readonly members: Readonly<Record<Role, Member>>;
}

/** Nobody signs in with it: a session row does that, without the cost of a hash. */
const NO_PASSWORD = 'no password opens this account';
const NAMES: Record<Role, string> = {
  'head-brewer': 'Orla Finch',
  brewer: 'Ned Quill',
  taster: 'Ivy Marsh',
};

/** A brewery with one season, nothing on its board, and a member of each role who is signed in. */
export async function writeBrewery(db: Db, name = 'Reedbed Brewing'): Promise<TestBrewery> {
  return db.transaction(async (tx) => {
    const head = await makePerson(tx, newcomer('head-brewer'));
    const { breweryId, seasonId } = await makeBrewery(tx, head, {
      breweryName: `${name} ${mark()}`,
      timeZone: 'Europe/London',
    });
    const rows = {
      'head-brewer': head,
      brewer: await join(tx, breweryId, 'brewer'),
      taster: await join(tx, breweryId, 'taster'),
    };
    const [made] = await tx
      .select({ slug: brewery.slug })
      .from(brewery)
      .where(inArray(brewery.id, [breweryId]));
    const members = {
      'head-brewer': await signIn(tx, rows['head-brewer']),
      brewer: await signIn(tx, rows.brewer),
      taster: await signIn(tx, rows.taster),
    };
    return { id: breweryId, slug: made?.slug ?? '', seasonId, members };
  });
}

/** Ends the sessions, so that a page left open cannot go on. The rows go with the database of the run. */
export async function leaveBrewery(db: Db, { members }: TestBrewery): Promise<void> {
  const ids = Object.values(members).map(({ id }) => id);
  await db.delete(session).where(inArray(session.personId, ids));
}

const mark = () => randomBytes(3).toString('hex');

const newcomer = (role: Role) => ({
  name: NAMES[role],
  email: `${role}-${randomUUID()}@reedbed.example`,
  passwordHash: NO_PASSWORD,
});

async function join(tx: Tx, breweryId: string, role: Role) {
  const made = await makePerson(tx, newcomer(role));
  await tx.insert(membership).values({ breweryId, personId: made.id, role });
  return made;
}

async function signIn(tx: Tx, who: typeof person.$inferSelect): Promise<Member> {
  const token = newToken();
  const expiresAt = new Date(Date.now() + 24 * 60 * 60 * 1000);
  await tx.insert(session).values({ tokenHash: hashToken(token), personId: who.id, expiresAt });
  return { id: who.id, name: who.name, email: who.email, token };
}
