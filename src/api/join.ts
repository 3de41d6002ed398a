import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { joined, joinPreview, type JoinRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request } from './client.ts';
import { sessionQuery } from './session.ts';

export const joinQuery = (token: string) =>
  queryOptions({
    queryKey: ['join', token],
    queryFn: ({ signal }) => request(joinPreview, 'GET', api.join(token), { signal }),
    retry: false,
  });

export function useJoin(token: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: JoinRequest) => request(joined, 'POST', api.join(token), { body }),
    onSuccess: ({ person }) => client.setQueryData(sessionQuery.queryKey, person),
  });
}
