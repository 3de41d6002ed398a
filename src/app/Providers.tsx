import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { isOnline, onConnectionChange } from '../api/connection.ts';
import { queryClient } from '../api/queryClient.ts';
import { sessionQuery, useSession } from '../api/session.ts';
import { applyTheme } from './theme.ts';

/** The person's own theme wins over what this browser remembers. */
function ThemeOfPerson() {
  const theme = useSession().data?.theme;
  useEffect(() => {
    if (theme) applyTheme(theme);
  }, [theme]);
  return null;
}

/** Whatever is drawn: what is read is kept for when there is no connection. It comes beside the page. */
async function beginKeeping() {
  const [{ keepAnswers }, { keptStore }, { restoreAnswers }] = await Promise.all([
    import('../kept/keepAnswers.ts'),
    import('../kept/keptStore.ts'),
    import('../kept/restoreAnswers.ts'),
  ]);
  keepAnswers(queryClient, {
    store: keptStore,
    person: () => queryClient.getQueryData(sessionQuery.queryKey)?.id ?? null,
    isSession: ({ queryKey }) => queryKey[0] === sessionQuery.queryKey[0],
  });
  // Pages that this tab has not shown yet may have been read before it was opened.
  onConnectionChange(() => {
    if (!isOnline()) void restoreAnswers(queryClient, sessionQuery.queryKey);
  });
}
void beginKeeping().catch(() => undefined);

export function Providers({ children }: { children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeOfPerson />
      {children}
    </QueryClientProvider>
  );
}
