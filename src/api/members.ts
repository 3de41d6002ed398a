import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { joinLink, joinLinkMade, type Role } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';

export const joinLinksQuery = (slug: string) =>
  queryOptions({
    queryKey: ['joinLinks', slug],
    queryFn: ({ signal }) => request(z.array(joinLink), 'GET', api.joinLinks(slug), { signal }),
  });

export function useMakeJoinLink(slug: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { id: string; role: Role }) =>
      request(joinLinkMade, 'POST', api.joinLinks(slug), { body }),
    onSettled: () => client.invalidateQueries({ queryKey: joinLinksQuery(slug).queryKey }),
  });
}

export function useWithdrawJoinLink(slug: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => requestNothing('DELETE', api.joinLink(slug, id)),
    onSettled: () => client.invalidateQueries({ queryKey: joinLinksQuery(slug).queryKey }),
  });
}
