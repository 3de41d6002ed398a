import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import {
  chainGuest,
  guestAccepted,
  guestMade,
  guestPreview,
  type GuestRequest,
} from '#shared/api/guest.ts';
import { api } from '#shared/api/urls.ts';
import { boardQuery } from './board.ts';
import { request, requestNothing } from './client.ts';

export const guestsQuery = (slug: string, chainId: string) =>
  queryOptions({
    queryKey: ['guests', slug, chainId],
    queryFn: ({ signal }) =>
      request(z.array(chainGuest), 'GET', api.guests(slug, chainId), { signal }),
  });

export function useInviteGuest(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: GuestRequest) =>
      request(guestMade, 'POST', api.guests(slug, chainId), { body }),
    onSettled: () => client.invalidateQueries({ queryKey: guestsQuery(slug, chainId).queryKey }),
  });
}

export function useWithdrawGuest(slug: string, chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: string) => requestNothing('DELETE', api.guest(slug, id)),
    onSettled: () => client.invalidateQueries({ queryKey: guestsQuery(slug, chainId).queryKey }),
  });
}

export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['guestInvitation', token],
    queryFn: ({ signal }) => request(guestPreview, 'GET', api.guestInvitation(token), { signal }),
    retry: false,
  });

export function useAcceptInvitation(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (brewerySlug: string) =>
      request(guestAccepted, 'POST', api.guestInvitation(token), { body: { brewerySlug } }),
    onSuccess: ({ brewerySlug }) =>
      client.invalidateQueries({ queryKey: boardQuery(brewerySlug).queryKey }),
  });
}

/** @param slug one's own brewery, on whose board the shelf stands */
export function useLeaveGuestShelf(slug: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (guestId: string) => requestNothing('DELETE', api.guestShelf(guestId)),
    onSettled: () => client.invalidateQueries({ queryKey: boardQuery(slug).queryKey }),
  });
}
