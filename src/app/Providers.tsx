import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { queryClient } from '../api/queryClient.ts';
import { sessionQuery, useSession } from '../api/session.ts';
import { keepAnswers } from '../kept/keepAnswers.ts';
import { keptStore } from '../kept/keptStore.ts';
import { applyTheme } from './theme.ts';

/** The person's own theme wins over what this browser remembers. */
function ThemeOfPerson() {
  const theme = useSession().data?.theme;
  useEffect(() => {
    if (theme) applyTheme(theme);
  }, [theme]);
  return null;
}

/** From the first moment on, whatever is drawn. */
keepAnswers(queryClient, {
  store: keptStore,
  person: () => queryClient.getQueryData(sessionQuery.queryKey)?.id ?? null,
  isSession: ({ queryKey }) => queryKey[0] === sessionQuery.queryKey[0],
});

export function Providers({ children }: { children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeOfPerson />
      {children}
    </QueryClientProvider>
  );
}
