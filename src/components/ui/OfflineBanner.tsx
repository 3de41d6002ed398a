import { useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { setReachable } from '../../api/connection.ts';
import { api } from '#shared/api/urls.ts';
import { useOnline } from '../../app/useOnline.ts';

export const OFFLINE_SENTENCE =
  'No connection. You can read what is here; nothing can be changed until it is back.';

/** Says that the connection is gone and looks for it again. */
export function OfflineBanner() {
  const online = useOnline();
  useComeBack(online);
  return (
    <div aria-live="polite" className="max-tablet:sticky max-tablet:top-0 max-tablet:z-20">
      {!online && (
        <p className="bg-mind-l px-7 py-2 text-center font-semibold text-mind max-tablet:px-4">
          {OFFLINE_SENTENCE}
        </p>
      )}
    </div>
  );
}

function useComeBack(online: boolean) {
  const client = useQueryClient();
  useEffect(() => {
    if (online) return;
    const look = async () => {
      const answer = await fetch(api.health, { cache: 'no-store' }).catch(() => null);
      if (answer) setReachable(true);
    };
    const timer = window.setInterval(look, 5_000);
    window.addEventListener('online', look);
    return () => {
      window.removeEventListener('online', look);
      window.clearInterval(timer);
      void client.invalidateQueries();
    };
  }, [online, client]);
}
