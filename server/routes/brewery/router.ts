import { eq } from 'drizzle-orm';
import { brewery as contract, breweryPatch } from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { brewery } from '../../db/schema/brewery.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canEditSeason, canRead } from '../../policies.ts';
import { notFound } from '../../problems.ts';
import { changeShared } from '../board/changeBoard.ts';
import { editBrewery } from './edit.ts';
import { makeBreweryRoute } from './make.ts';
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
    problems: ['season-archived'],
  },
  canEditSeason,
  async (asked, member) => {
    const { body, version } = asked;
    await changeShared(asked, member, editBrewery(version, body));
    const [row] = await asked.db.select().from(brewery).where(eq(brewery.id, member.brewery.id));
    if (!row) throw notFound();
    return { body: presentBrewery(row), version: row.version };
  },
);

export const breweryRoutes = [makeBreweryRoute, read, edit];
