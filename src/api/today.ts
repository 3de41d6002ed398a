import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';
import { todayFacts } from '#shared/api/today.ts';
import { api } from '#shared/api/urls.ts';
import { KEPT } from '../kept/meta.ts';
import { request } from './client.ts';
import { serverClock } from './serverClock.ts';

/** What waits and does not stand on the board. The only owner of its key. */
export const todayQuery = (slug: string) =>
  queryOptions({
    queryKey: ['today', slug] as const,
    queryFn: ({ signal }) =>
      serverClock.measured(() => request(todayFacts, 'GET', api.today(slug), { signal })),
    meta: KEPT,
  });

/** Read anew whenever anything in the season changed. */
export function useTodayFacts(slug: string, revision: number) {
  const client = useQueryClient();
  const known = useRef(revision);
  useEffect(() => {
    if (known.current === revision) return;
    known.current = revision;
    void client.invalidateQueries({ queryKey: todayQuery(slug).queryKey });
  }, [client, slug, revision]);
  return useQuery(todayQuery(slug));
}
