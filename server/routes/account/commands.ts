import { randomUUID } from 'node:crypto';
import { and, eq, sql } from 'drizzle-orm';
import type { AccountPatch, SignUpRequest } from '#shared/api/people.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Tx } from '../../db/client.ts';
import { brewery, houseRules, membership } from '../../db/schema/brewery.ts';
import { person } from '../../db/schema/people.ts';
import { season } from '../../db/schema/season.ts';
import { problem } from '../../problems.ts';
import { DEFAULT_CURRENCY, DEFAULT_TIME_ZONE, DEFAULT_UNITS } from './defaults.ts';
import { freeSlug } from './slug.ts';

interface NewPerson {
  name: string;
  email: string;
  passwordHash: string;
}

/** Two sign-ups of one address at once: the index on lower(email) lets one through. */
export async function makePerson(tx: Tx, who: NewPerson): Promise<PersonRow> {
  const [made] = await tx
    .insert(person)
    .values({ id: randomUUID(), ...who, units: DEFAULT_UNITS })
    .onConflictDoNothing()
    .returning();
  if (made) return made;
  throw problem('already-exists', {
    detail: 'There is an account with this e-mail address: sign in instead',
    errors: [{ detail: 'This address has an account already', pointer: '/email' }],
  });
}

/** A brewery with its first season; whoever makes it is its head brewer. */
export async function makeBrewery(
  tx: Tx,
  head: PersonRow,
  wish: Pick<SignUpRequest, 'breweryName' | 'timeZone'>,
  breweryId: string = randomUUID(),
): Promise<{ breweryId: string; seasonId: string }> {
  const name = wish.breweryName ?? `${head.name}’s brewery`.slice(0, 60);
  const seasonId = randomUUID();
  await tx.insert(brewery).values({
    id: breweryId,
    slug: await freeSlug(tx, name),
    name,
    timeZone: wish.timeZone ?? DEFAULT_TIME_ZONE,
    currency: DEFAULT_CURRENCY,
    units: DEFAULT_UNITS,
  });
  await tx.insert(houseRules).values({ breweryId });
  await tx.insert(season).values({ id: seasonId, breweryId, name: 'First season' });
  await tx.insert(membership).values({ breweryId, personId: head.id, role: 'head-brewer' });
  return { breweryId, seasonId };
}

/** @returns the row as edited, or null where it has another version by now. */
export async function editPerson(
  tx: Tx,
  id: string,
  version: number,
  patch: AccountPatch,
): Promise<PersonRow | null> {
  const [edited] = await tx
    .update(person)
    .set({ ...patch, version: sql`${person.version} + 1` })
    .where(and(eq(person.id, id), eq(person.version, version)))
    .returning();
  return edited ?? null;
}

export async function findByEmail(
  db: Pick<Tx, 'select'>,
  email: string,
): Promise<PersonRow | null> {
  const [found] = await db
    .select()
    .from(person)
    .where(sql`lower(${person.email}) = lower(${email})`);
  return found ?? null;
}
