import { queryOptions } from '@tanstack/react-query';
import { recordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { request } from './client.ts';

/** Who changed a row last: of a batch, a shelf, a yeast, a vessel or the season itself. */
export const lastChangeQuery = (
  slug: string,
  seasonId: string,
  row: { id: string; version: number },
) =>
  queryOptions({
    queryKey: ['lastChange', slug, seasonId, row.id, row.version],
    queryFn: async ({ signal }) => {
      const url = `${api.changes(slug, seasonId)}?batch=${row.id}`;
      const { changes } = await request(recordPage, 'GET', url, { signal });
      return changes[0]?.person ?? null;
    },
    staleTime: Infinity,
    refetchOnWindowFocus: false,
  });
