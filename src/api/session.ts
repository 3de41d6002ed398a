import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { person, type Person, type SignInRequest, type SignUpRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { isProblem } from './errors.ts';

/** Who is signed in; null: nobody. */
export const sessionQuery = queryOptions({
  queryKey: ['session'],
  queryFn: async ({ signal }): Promise<Person | null> => {
    try {
      return await request(person, 'GET', api.session, { signal });
    } catch (error) {
      if (isProblem(error, 'not-signed-in')) return null;
      throw error;
    }
  },
  staleTime: 60_000,
});

export const useSession = () => useQuery(sessionQuery);

export function useSignIn() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignInRequest) => request(person, 'POST', api.session, { body }),
    onSuccess: (who) => {
      client.clear();
      client.setQueryData(sessionQuery.queryKey, who);
    },
  });
}

export function useSignUp() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: SignUpRequest) => request(person, 'POST', api.account, { body }),
    onSuccess: (who) => {
      client.clear();
      client.setQueryData(sessionQuery.queryKey, who);
    },
  });
}

export function useSignOut() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => requestNothing('DELETE', api.session),
    onSuccess: () => {
      client.clear();
      client.setQueryData(sessionQuery.queryKey, null);
    },
  });
}
