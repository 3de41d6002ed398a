import { useMutation } from '@tanstack/react-query';
import { season, type SeasonPatch } from '#shared/api/brewery.ts';
import { api } from '#shared/api/urls.ts';
import { useBoardChanged } from './boardChanged.ts';
import { request } from './client.ts';

export function useSeasonPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: SeasonPatch }) =>
      request(season, 'PATCH', api.season(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}
