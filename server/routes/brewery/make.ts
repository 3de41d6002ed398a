import { eq } from 'drizzle-orm';
import { breweryCreate, type BreweryCreate } from '#shared/api/membership.ts';
import { joined } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import type { PersonRow } from '../../auth/sessions.ts';
import type { Tx } from '../../db/client.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { forSignedIn } from '../../http/route.ts';
import { problem } from '../../problems.ts';
import { makeBrewery } from '../account/commands.ts';
import { demandTimeZone } from '../account/defaults.ts';
import { presentPerson } from '../account/present.ts';
import { belongs } from '../join/commands.ts';

/** Asked again under the same id (the answer was lost), it answers the brewery that was made. */
async function makeOnce(tx: Tx, who: PersonRow, wish: BreweryCreate): Promise<string> {
  const bySlug = () =>
    tx
      .select({ slug: brewery.slug, name: brewery.name })
      .from(brewery)
      .where(eq(brewery.id, wish.id));
  const [known] = await bySlug();
  if (known) {
    if (known.name === wish.name && (await belongs(tx, wish.id, who.id))) return known.slug;
    throw problem('already-exists', { detail: 'This id is in use: make a new one' });
  }
  await makeBrewery(tx, who, { breweryName: wish.name, timeZone: wish.timeZone }, wish.id);
  const [made] = await bySlug();
  return made?.slug ?? '';
}

export const makeBreweryRoute = forSignedIn(
  {
    name: 'makeBrewery',
    method: 'post',
    path: api.breweries,
    summary: 'Make another brewery; who makes it is its head brewer',
    body: breweryCreate,
    answer: joined,
    status: 201,
    problems: ['already-exists', 'too-many'],
  },
  async ({ db, body, tries }, { person: who }) => {
    await tries.count('breweriesByPerson', who.id);
    const { timeZone, ...wish } = body;
    const zone = timeZone === undefined ? {} : { timeZone: demandTimeZone(timeZone) };
    const brewerySlug = await db.transaction((tx) => makeOnce(tx, who, { ...wish, ...zone }));
    return { body: { person: await presentPerson(db, who), brewerySlug } };
  },
);
