import type { Request } from 'express';
import { liveQuery } from '#shared/api/live.ts';
import { api } from '#shared/api/urls.ts';
import { tokenIn } from '../../auth/cookie.ts';
import { hashToken } from '../../auth/tokens.ts';
import { pathOf } from '../../http/pathOf.ts';
import { forMember } from '../../http/route.ts';
import { canRead } from '../../policies.ts';

const watch = forMember(
  {
    name: 'watchSeason',
    method: 'get',
    path: pathOf(api.seasonEvents(':brewery', ':season')),
    summary:
      'What happens on a season’s board, as Server-Sent Events: revisions after `since` (or Last-Event-ID), and who is here',
    query: liveQuery,
    answer: null,
    stream: true,
    status: 200,
  },
  canRead,
  async ({ live, req }, { person, brewery, seasonId }) => {
    const since = sinceOf(req);
    const tokenHash = hashToken(tokenIn(req) ?? '');
    const watcher = { personId: person.id, tokenHash, breweryId: brewery.id, seasonId };
    return { stream: (res) => live.open(res, watcher, since) };
  },
);

/** A browser that comes back by itself names the last event; one that never came says what it has read. */
function sinceOf(req: Request): number | undefined {
  const last = liveQuery.safeParse({ since: req.get('last-event-id') });
  if (last.success && last.data.since !== undefined) return last.data.since;
  return liveQuery.parse({ since: req.query.since }).since;
}

export const liveRoutes = [watch];
