import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { HandOver } from '#shared/api/membership.ts';
import { joinLink, joinLinkMade, member, type Member, type Role } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { useBoardChanged } from './boardChanged.ts';
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

/** A change of who somebody is here, made from the version that was seen. */
type Of = Pick<Member, 'personId' | 'version'>;

export function useChangeRole(slug: string) {
  return useMutation({
    mutationFn: ({ personId, version, role }: Of & { role: Role }) =>
      request(member, 'PATCH', api.member(slug, personId), { body: { role }, ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

export function useHandOver(slug: string) {
  return useMutation({
    mutationFn: ({ personId, version, stepDownTo }: Of & HandOver) =>
      request(z.array(member), 'POST', api.handOver(slug, personId), {
        body: { stepDownTo },
        ifMatch: version,
      }),
    ...useBoardChanged(slug),
  });
}

export function useRemoveMember(slug: string) {
  return useMutation({
    mutationFn: ({ personId, version }: Of) =>
      requestNothing('DELETE', api.member(slug, personId), { ifMatch: version }),
    ...useBoardChanged(slug),
  });
}

/** @param onLeft also called where the page went away meanwhile: the stream may tell it first */
export const useLeaveBrewery = (slug: string, onLeft: () => Promise<void>) =>
  useMutation({
    mutationFn: ({ version }: Of) =>
      requestNothing('DELETE', api.membership(slug), { ifMatch: version }),
    onSuccess: onLeft,
  });
