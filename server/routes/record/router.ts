import { recordPage, recordQuery } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canRead } from '../../policies.ts';
import { readRecord } from './read.ts';

export const recordRoutes = [
  forMember(
    {
      name: 'readRecord',
      method: 'get',
      path: pathOf(api.changes(':brewery', ':season')),
      summary: 'Everything that happened in a season, newest first',
      query: recordQuery,
      answer: recordPage,
      status: 200,
    },
    canRead,
    async ({ db, req }, { brewery, seasonId }) => ({
      body: await readRecord(db, brewery, seasonId, recordQuery.parse(req.query)),
    }),
  ),
];
