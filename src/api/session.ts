import {
  queryOptions,
  useMutation,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query';
import { person, type Person, type SignInRequest, type SignUpRequest } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { request, requestNothing } from './client.ts';
import { isProblem, OfflineError } from './errors.ts';
import { forgetAnswers } from './forgetAnswers.ts';
import { KEPT } from '../kept/meta.ts';

/** A weak network may take a request and never answer it: the page then opens with what is kept. */
const PATIENCE_MS = 10_000;
const SESSION_KEY = ['session'] as const;

/** Who is signed in; null: nobody. */
export const sessionQuery = queryOptions({
  queryKey: SESSION_KEY,
  queryFn: async ({ client, signal }): Promise<Person | null> => {
    try {
      const patience = AbortSignal.any([signal, AbortSignal.timeout(PATIENCE_MS)]);
      return await request(person, 'GET', api.session, { signal: patience });
    } catch (error) {
      if (isProblem(error, 'not-signed-in')) return null;
      if (!(error instanceof OfflineError)) throw error;
      return lastKnown(client, error);
    }
  },
  staleTime: 60_000,
  ...KEPT,
});

/** Without a connection: whoever was signed in here last, with what they read then. */
async function lastKnown(client: QueryClient, error: OfflineError): Promise<Person> {
  if (client.getQueryData(SESSION_KEY)) throw error;
  const { restoreAnswers } = await import('../kept/restoreAnswers.ts').catch(() => {
    throw error;
  });
  const kept = person.safeParse(await restoreAnswers(client, SESSION_KEY));
  if (!kept.success) throw error;
  return kept.data;
}

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
      // An answer after a silence has all that is shown read anew: nobody may read it any more.
      void client.cancelQueries();
      // Whoever shows what was read sees this first, and goes.
      client.setQueryData(sessionQuery.queryKey, null);
      forgetAnswers(client, { but: SESSION_KEY });
    },
  });
}
