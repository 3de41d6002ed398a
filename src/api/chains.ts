import { useMutation } from '@tanstack/react-query';
import { chain, datesPulled, type ChainCreate, type ChainPatch } from '#shared/api/chain.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { useBoardChanged } from './boardChanged.ts';

export function useChainCreate(slug: string) {
  return useMutation({
    mutationFn: (body: ChainCreate) => request(chain, 'POST', api.chains(slug), { body }),
    ...useBoardChanged(slug),
  });
}

export function useChainPatch(slug: string) {
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: ChainPatch }) =>
      request(chain, 'PATCH', api.chain(slug, id), { body: patch, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

export function useChainDelete(slug: string) {
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) =>
      requestNothing('DELETE', api.chain(slug, id), { ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

/** Every pencilled batch of a chain brewed on the day the yeast before it is taken. */
export function usePullChain(slug: string) {
  return useMutation({
    mutationFn: (id: string) => request(datesPulled, 'POST', api.pullDates(slug, id)),
    ...useBoardChanged(slug),
  });
}
