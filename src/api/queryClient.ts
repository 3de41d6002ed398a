import { QueryClient } from '@tanstack/react-query';
import { OfflineError, ProblemError } from './errors.ts';

/** Mutations never wait in silence for a connection: they fail at once and say so. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      networkMode: 'always',
      staleTime: 5_000,
      refetchOnWindowFocus: 'always',
      retry: (count, error) =>
        !(error instanceof ProblemError) && !(error instanceof OfflineError) && count < 1,
    },
    mutations: { networkMode: 'always', retry: false },
  },
});
