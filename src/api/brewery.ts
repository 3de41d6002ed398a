import { useMutation, useQueryClient } from '@tanstack/react-query';
import { brewery, type BreweryPatch } from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { useBoardChanged } from './boardChanged.ts';
import { request } from './client.ts';
import { sessionQuery } from './session.ts';

export function useBreweryPatch(slug: string) {
  const client = useQueryClient();
  const changed = useBoardChanged(slug);
  return useMutation({
    mutationFn: ({ version, patch }: { version: number; patch: BreweryPatch }) =>
      request(brewery, 'PATCH', api.brewery(slug), { body: patch, ifMatch: version }),
    onSettled: async () => {
      await client.invalidateQueries({ queryKey: sessionQuery.queryKey });
      await changed.onSettled();
    },
  });
}
