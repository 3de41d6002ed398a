import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import {
  closingPreview,
  signInPlace,
  type AccountClosing,
  type EmailChange,
  type PasswordChange,
} from '#shared/api/account.ts';
import { person, type AccountPatch } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { sessionQuery } from './session.ts';

export function useAccountPatch() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, patch }: { version: number; patch: AccountPatch }) =>
      request(person, 'PATCH', api.account, { body: patch, ifMatch: version }),
    onSuccess: (who) => {
      client.setQueryData(sessionQuery.queryKey, who);
      // The name stands among the members of every board.
      void client.invalidateQueries({ queryKey: ['board'] });
    },
  });
}

export function useChangeEmail() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ version, ...body }: EmailChange & { version: number }) =>
      request(person, 'PUT', api.accountEmail, { body, ifMatch: version }),
    onSuccess: (who) => client.setQueryData(sessionQuery.queryKey, who),
    onError: () => client.invalidateQueries(sessionQuery),
  });
}

export function useChangePassword() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: PasswordChange) => requestNothing('PUT', api.accountPassword, { body }),
    onSuccess: () => client.invalidateQueries(signInsQuery),
  });
}

export const signInsQuery = queryOptions({
  queryKey: ['signIns'],
  queryFn: ({ signal }) => request(z.array(signInPlace), 'GET', api.signIns, { signal }),
});

/** @param mark null: everywhere but here */
export function useEndSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (mark: string | null) =>
      requestNothing('DELETE', mark === null ? api.signIns : api.signInOf(mark)),
    onSettled: () => client.invalidateQueries(signInsQuery),
  });
}

export const closingQuery = queryOptions({
  queryKey: ['closing'],
  queryFn: ({ signal }) => request(closingPreview, 'GET', api.accountClosing, { signal }),
  staleTime: 0,
});

/** The front page is loaded anew, so that nothing of the account stays in memory. */
export function useCloseAccount() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: AccountClosing) => requestNothing('POST', api.accountClosing, { body }),
    onSuccess: () => location.replace('/'),
    onError: () => client.invalidateQueries(closingQuery),
  });
}
