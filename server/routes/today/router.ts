import { todayFacts } from '#shared/api/today.ts';
import { api } from '#shared/api/urls.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canRead } from '../../policies.ts';
import { readToday } from './read.ts';

export const todayRoutes = [
  forMember(
    {
      name: 'readToday',
      method: 'get',
      path: pathOf(api.today(':brewery')),
      summary: 'What waits to be done in a season and does not stand on its board',
      answer: todayFacts,
      status: 200,
    },
    canRead,
    async ({ db, clock }, { brewery, seasonId }) => ({
      body: {
        now: clock.now().toISOString(),
        ...(await readToday(db, { breweryId: brewery.id, seasonId })),
      },
    }),
  ),
];
