import { infiniteQueryOptions, useInfiniteQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { recordPage, type RecordQuery } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { request } from './client.ts';

export type RecordFilter = Omit<RecordQuery, 'before'>;

function addressOf(slug: string, seasonId: string, filter: RecordFilter, before: string | null) {
  const query = new URLSearchParams();
  for (const [name, value] of Object.entries(filter)) if (value) query.set(name, value);
  if (before !== null) query.set('before', before);
  return `${api.changes(slug, seasonId)}?${query.toString()}`;
}

const recordQuery = (slug: string, seasonId: string, filter: RecordFilter) =>
  infiniteQueryOptions({
    queryKey: ['record', slug, seasonId, filter] as const,
    queryFn: ({ pageParam, signal }) =>
      request(recordPage, 'GET', addressOf(slug, seasonId, filter, pageParam), { signal }),
    initialPageParam: null as string | null,
    getNextPageParam: ({ next }) => next,
  });

/** What happened in a season, page by page, read anew when its board changes. */
export function useRecord(
  slug: string,
  season: { id: string; revision: number },
  filter: RecordFilter,
) {
  const client = useQueryClient();
  const { id, revision } = season;
  useEffect(() => {
    void client.invalidateQueries({ queryKey: ['record', slug, id] });
  }, [client, slug, id, revision]);
  return useInfiniteQuery(recordQuery(slug, id, filter));
}
