import type { Brewery } from '#shared/api/brewery.ts';
import type { brewery } from '../../db/schema/brewery.ts';

export function presentBrewery(row: typeof brewery.$inferSelect): Brewery {
  const { id, slug, version, name, timeZone, currency, units } = row;
  return { id, slug, version, name, timeZone, currency, units };
}
