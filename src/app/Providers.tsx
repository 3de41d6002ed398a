import { QueryClientProvider } from '@tanstack/react-query';
import { useEffect, type ReactNode } from 'react';
import { queryClient } from '../api/queryClient.ts';
import { useSession } from '../api/session.ts';
import { applyTheme } from './theme.ts';

/** The person's own theme wins over what this browser remembers. */
function ThemeOfPerson() {
  const theme = useSession().data?.theme;
  useEffect(() => {
    if (theme) applyTheme(theme);
  }, [theme]);
  return null;
}

export function Providers({ children }: { children: ReactNode }) {
  return (
    <QueryClientProvider client={queryClient}>
      <ThemeOfPerson />
      {children}
    </QueryClientProvider>
  );
}
