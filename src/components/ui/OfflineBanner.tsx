import { useQueryClient, type QueryCache } from '@tanstack/react-query';
import { useEffect, useSyncExternalStore } from 'react';
import { isOnline, setReachable } from '../../api/connection.ts';
import { api } from '#shared/api/urls.ts';
import { useOnline } from '../../app/useOnline.ts';
import { asOf } from '../../kept/asOf.ts';
import { OFFLINE_SENTENCE } from './offlineSentence.ts';

const LATER = 'Brew-day entries are kept and sent later; the plan waits.';

/** When the oldest thing was read that the page shows, ms since 1970; null: it is not kept here. */
function readAt(cache: QueryCache): number | null {
  const shown = cache.findAll({
    type: 'active',
    predicate: ({ meta, queryKey, state }) =>
      meta?.kept === true && queryKey[0] !== 'session' && state.dataUpdatedAt > 0,
  });
  return shown.length === 0 ? null : Math.min(...shown.map(({ state }) => state.dataUpdatedAt));
}

/** How old it is, in words. */
function useAge(): string | null {
  const cache = useQueryClient().getQueryCache();
  const at = useSyncExternalStore(
    (look) => cache.subscribe(look),
    () => readAt(cache),
  );
  return at === null ? null : asOf(at);
}

/** Says that the connection is gone and looks for it again. */
export function OfflineBanner() {
  const online = useOnline();
  useComeBack(online);
  return (
    <div
      aria-live="polite"
      data-cover
      className="max-tablet:sticky max-tablet:top-0 max-tablet:z-20"
    >
      {!online && <Offline />}
    </div>
  );
}

function Offline() {
  const age = useAge();
  return (
    <p className="bg-mind-l px-7 py-2 text-center font-semibold text-mind max-tablet:px-4">
      {age === null
        ? OFFLINE_SENTENCE
        : `No connection. You can read what is here, as it was ${age}. ${LATER}`}
    </p>
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
      // It may also be the page that goes: there is nothing to read anew then.
      if (isOnline()) void client.invalidateQueries();
    };
  }, [online, client]);
}
