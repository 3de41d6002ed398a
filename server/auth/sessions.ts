import { and, eq, gt, lt, sql } from 'drizzle-orm';
import type { Request } from 'express';
import type { Db, Tx } from '../db/client.ts';
import { oncePer } from '../db/oncePer.ts';
import { person, session } from '../db/schema/people.ts';
import { tell } from '../live/note.ts';
import type { Clock } from '../clock.ts';
import { deviceWords } from './device.ts';
import { giveCookie, SESSION_MS, takeCookie, tokenIn } from './cookie.ts';
import { hashToken, newToken } from './tokens.ts';

export type PersonRow = typeof person.$inferSelect;

export interface SignedIn {
  person: PersonRow;
  tokenHash: string;
}

/**
 * Signs somebody in: a row with the token's hash, and the token as a cookie. Ends the session before
 * it, and sweeps out those that have run out.
 */
export async function startSession(
  db: Db | Tx,
  clock: Clock,
  req: Request,
  personId: string,
): Promise<void> {
  const now = clock.now();
  const before = tokenIn(req);
  if (before !== null) await db.delete(session).where(eq(session.tokenHash, hashToken(before)));
  await db.delete(session).where(lt(session.expiresAt, now));
  const token = newToken();
  await db.insert(session).values({
    tokenHash: hashToken(token),
    personId,
    createdAt: now,
    seenAt: now,
    device: deviceWords(req.get('user-agent')),
    expiresAt: new Date(now.getTime() + SESSION_MS),
  });
  giveCookie(req, token);
}

export async function endSession(db: Db, req: Request): Promise<void> {
  const token = tokenIn(req);
  takeCookie(req);
  if (token === null) return;
  const ended = await db
    .delete(session)
    .where(eq(session.tokenHash, hashToken(token)))
    .returning({ personId: session.personId });
  for (const { personId } of ended) await tell(db, { kind: 'person', personId });
}

const MS_A_DAY = 24 * 60 * 60 * 1000;
/** When somebody was last seen is known to within this time, so that hardly any request writes it. */
const SEEN_WITHIN_MS = 10 * 60 * 1000;

/** What tells of a sign-in who it is, and whether it is to be prolonged. */
export const SESSION = {
  person,
  expiresAt: session.expiresAt,
  createdAt: session.createdAt,
  seenAt: session.seenAt,
};
type SessionRow = Pick<typeof session.$inferSelect, 'expiresAt' | 'createdAt' | 'seenAt'>;

export interface SessionKey extends Record<string, unknown> {
  tokenHash: string;
  now: Date;
}

/** Who is signed in. */
export async function findSignedIn(db: Db, clock: Clock, req: Request): Promise<SignedIn | null> {
  return findSession(db, clock, req, async (key) => (await sessionQuery(db).execute(key))[0]);
}

/**
 * The request's session, with whatever else `ask` reads beside it. The 30 days start again with use,
 * written at most once a day.
 */
export async function findSession<Found extends SessionRow>(
  db: Db,
  clock: Clock,
  req: Request,
  ask: (key: SessionKey) => Promise<Found | undefined>,
): Promise<(Found & { tokenHash: string }) | null> {
  const token = tokenIn(req);
  if (token === null) return null;
  const tokenHash = hashToken(token);
  const now = clock.now();
  const found = await ask({ tokenHash, now });
  if (!found) return null;
  const isOld = found.expiresAt.getTime() < now.getTime() + SESSION_MS - MS_A_DAY;
  const seenAt = found.seenAt ?? found.createdAt;
  if (isOld || seenAt.getTime() + SEEN_WITHIN_MS <= now.getTime()) {
    const prolonged = isOld ? { expiresAt: new Date(now.getTime() + SESSION_MS) } : {};
    await db
      .update(session)
      .set({ seenAt: now, ...prolonged })
      .where(eq(session.tokenHash, tokenHash));
  }
  if (isOld) giveCookie(req, token);
  return { ...found, tokenHash };
}

/** Who is signed in, asked in passing: the session is not prolonged and no cookie is given. */
export async function personOf(db: Db, now: Date, req: Request): Promise<string | null> {
  const token = tokenIn(req);
  if (token === null) return null;
  const [found] = await sessionQuery(db).execute({ tokenHash: hashToken(token), now });
  return found?.person.id ?? null;
}

/** The session that a token's hash opens, while it lasts. */
const isOpen = () =>
  and(
    eq(session.tokenHash, sql.placeholder('tokenHash')),
    gt(session.expiresAt, sql.placeholder('now')),
  );

const sessionQuery = oncePer((db: Db) =>
  db
    .select(SESSION)
    .from(session)
    .innerJoin(person, eq(person.id, session.personId))
    .where(isOpen())
    .prepare('session'),
);
