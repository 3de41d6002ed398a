import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { listedSeason, type ListedSeason, type SeasonCreate } from '#shared/api/brewery.ts';
import { api, slugOf } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';

/** All seasons of a brewery, the same from whichever of them one looks. */
export function seasonsQuery(place: string) {
  const slug = slugOf(place);
  return queryOptions({
    queryKey: ['seasons', slug],
    queryFn: ({ signal }) => request(z.array(listedSeason), 'GET', api.seasons(slug), { signal }),
  });
}

/** What is done with a season as a whole: the list and every board of the brewery are read anew. */
function useSeasonsChanged(place: string) {
  const client = useQueryClient();
  return {
    onSettled: () =>
      Promise.all([
        client.invalidateQueries({ queryKey: seasonsQuery(place).queryKey }),
        client.invalidateQueries({ queryKey: ['board'] }),
      ]),
  };
}

export function useSeasonCreate(place: string) {
  return useMutation({
    mutationFn: (body: SeasonCreate) =>
      request(listedSeason, 'POST', api.seasons(slugOf(place)), { body }),
    ...useSeasonsChanged(place),
  });
}

type Named = Pick<ListedSeason, 'id' | 'version'>;

export function useMakeCurrent(place: string) {
  return useMutation({
    mutationFn: ({ id, version }: Named) =>
      request(listedSeason, 'POST', api.currentSeason(place, id), { ifMatch: version }),
    ...useSeasonsChanged(place),
  });
}

export function useArchive(place: string) {
  return useMutation({
    mutationFn: ({ id, version, away }: Named & { away: boolean }) =>
      request(listedSeason, away ? 'POST' : 'DELETE', api.seasonArchive(place, id), {
        ifMatch: version,
      }),
    ...useSeasonsChanged(place),
  });
}

/** @param onGone first of all: who looks at the season that is gone looks away. */
export function useSeasonDelete(place: string, onGone: () => Promise<void>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: Named) =>
      requestNothing('DELETE', api.season(place, id), { ifMatch: version }),
    onSuccess: onGone,
    onSettled: () => client.invalidateQueries({ queryKey: seasonsQuery(place).queryKey }),
  });
}
