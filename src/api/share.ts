import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { chain } from '#shared/api/chain.ts';
import {
  sharedChain,
  shareLink,
  shareLinkMade,
  type CopyRequest,
  type ShareLinkPatch,
  type ShareLinkRequest,
} from '#shared/api/share.ts';
import { api } from '#shared/api/urls.ts';
import { boardQuery } from './board.ts';
import { request, requestNothing } from './client.ts';

export const shareLinksQuery = (slug: string, chainId: string) =>
  queryOptions({
    queryKey: ['shareLinks', slug, chainId],
    queryFn: ({ signal }) =>
      request(z.array(shareLink), 'GET', api.shareLinks(slug, chainId), { signal }),
  });

export function useMakeShareLink(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: ShareLinkRequest) =>
      request(shareLinkMade, 'POST', api.shareLinks(slug, chainId), { body }),
    onSettled: () =>
      client.invalidateQueries({ queryKey: shareLinksQuery(slug, chainId).queryKey }),
  });
}

export function useEditShareLink(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version, patch }: { id: string; version: number; patch: ShareLinkPatch }) =>
      request(shareLink, 'PATCH', api.shareLink(slug, id), { body: patch, ifMatch: version }),
    onSettled: () =>
      client.invalidateQueries({ queryKey: shareLinksQuery(slug, chainId).queryKey }),
  });
}

export function useWithdrawShareLink(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => requestNothing('DELETE', api.shareLink(slug, id)),
    onSettled: () =>
      client.invalidateQueries({ queryKey: shareLinksQuery(slug, chainId).queryKey }),
  });
}

/** Asked for once: every time it is asked for counts as a visit. */
export const sharedQuery = (token: string) =>
  queryOptions({
    queryKey: ['shared', token],
    queryFn: ({ signal }) => request(sharedChain, 'GET', api.shared(token), { signal }),
    retry: false,
    staleTime: Infinity,
    refetchOnWindowFocus: false,
    refetchOnReconnect: false,
  });

export function useCopyChain() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ slug, ...body }: CopyRequest & { slug: string }) =>
      request(chain, 'POST', api.copies(slug), { body }),
    onSuccess: (_, { slug }) => client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
  });
}
