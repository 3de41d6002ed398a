import { queryOptions, useQuery } from '@tanstack/react-query';
import { todayFacts } from '#shared/api/today.ts';
import { api } from '#shared/api/urls.ts';
import { KEPT } from '../kept/meta.ts';
import { request } from './client.ts';
import { serverClock } from './serverClock.ts';
import { useReadAnew } from './useReadAnew.ts';

/** What waits and does not stand on the board. The only owner of its key. */
export const todayQuery = (slug: string) =>
  queryOptions({
    queryKey: ['today', slug] as const,
    queryFn: ({ signal }) =>
      serverClock.measured(() => request(todayFacts, 'GET', api.today(slug), { signal })),
    ...KEPT,
  });

/** Read anew whenever anything in the season changed. */
export function useTodayFacts(slug: string, revision: number) {
  const query = todayQuery(slug);
  useReadAnew(query.queryKey, revision);
  return useQuery(query);
}
