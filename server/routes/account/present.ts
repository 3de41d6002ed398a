import { eq } from 'drizzle-orm';
import type { Person } from '#shared/api/people.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Db, Tx } from '../../db/client.ts';
import { brewery, membership } from '../../db/schema/brewery.ts';

/** A person as they see themselves, with the breweries they belong to. */
export async function presentPerson(db: Db | Tx, row: PersonRow): Promise<Person> {
  const breweries = await db
    .select({
      brewery: { id: brewery.id, slug: brewery.slug, name: brewery.name },
      role: membership.role,
    })
    .from(membership)
    .innerJoin(brewery, eq(brewery.id, membership.breweryId))
    .where(eq(membership.personId, row.id))
    .orderBy(membership.joinedAt, brewery.name);
  const { id, version, name, email, units, theme } = row;
  return { id, version, name, email, units, theme, breweries };
}
