import { and, eq, sql } from 'drizzle-orm';
import { brewery as contract, breweryPatch } from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditSeason, canRead } from '../../policies.ts';
import { problem } from '../../problems.ts';
import { demandTimeZone } from '../account/defaults.ts';
import { raiseRevision } from '../board/record.ts';
import { presentBrewery } from './present.ts';

const path = pathOf(api.brewery(':brewery'));

const read = forMember(
  {
    name: 'readBrewery',
    method: 'get',
    path,
    summary: 'A brewery that one belongs to',
    answer: contract,
    status: 200,
  },
  canRead,
  async (_asked, member) => ({
    body: presentBrewery(member.brewery),
    version: member.brewery.version,
  }),
);

const edit = forMember(
  {
    name: 'editBrewery',
    method: 'patch',
    path,
    summary: 'Change the brewery’s name, time zone, currency or units',
    body: breweryPatch,
    answer: contract,
    status: 200,
    ifMatch: true,
  },
  canEditSeason,
  async ({ db, body, version }, { brewery: { id }, seasonId }) => {
    const { timeZone, ...patch } = body;
    const zone = timeZone === undefined ? {} : { timeZone: demandTimeZone(timeZone) };
    const row = await db.transaction(async (tx) => {
      const [edited] = await tx
        .update(brewery)
        .set({ ...patch, ...zone, version: sql`${brewery.version} + 1` })
        .where(and(eq(brewery.id, id), eq(brewery.version, version)))
        .returning();
      if (edited) await raiseRevision(tx, seasonId);
      return edited;
    });
    if (row) return { body: presentBrewery(row), version: row.version };
    const [now] = await db.select().from(brewery).where(eq(brewery.id, id));
    throw problem('changed-since', { current: now && presentBrewery(now) });
  },
);

export const breweryRoutes = [read, edit];
