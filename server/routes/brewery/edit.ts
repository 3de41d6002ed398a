import { eq, sql } from 'drizzle-orm';
import type { BreweryPatch } from '#shared/api/brewery.ts';
import { tellBrewery } from '#shared/record/brewery.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { demandVersion } from '../../http/etag.ts';
import { notFound } from '../../problems.ts';
import { demandTimeZone } from '../account/defaults.ts';
import type { Command } from '../board/changeBoard.ts';
import { presentBrewery } from './present.ts';

/** Changes the brewery itself; the record of the season that it is done from tells it. */
export const editBrewery =
  (version: number, { timeZone, ...patch }: BreweryPatch): Command =>
  async ({ tx, member }) => {
    const { id } = member.brewery;
    const zone = timeZone === undefined ? {} : { timeZone: demandTimeZone(timeZone) };
    const [row] = await tx.select().from(brewery).where(eq(brewery.id, id)).for('update');
    if (!row) throw notFound();
    demandVersion(version, row.version, presentBrewery(row));
    const [after] = await tx
      .update(brewery)
      .set({ ...patch, ...zone, version: sql`${brewery.version} + 1` })
      .where(eq(brewery.id, id))
      .returning();
    if (!after) throw notFound();
    return { ...tellBrewery(presentBrewery(row), presentBrewery(after)), touches: [id] };
  };
