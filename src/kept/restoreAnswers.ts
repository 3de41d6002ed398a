import type { QueryClient, QueryKey } from '@tanstack/react-query';
import { CONTRACT } from '#shared/api/contract.ts';
import { keptStore, type Kept } from './keptStore.ts';

/**
 * Puts the kept answers back where nothing newer was read, and gives the session's. Only those of
 * one person, never of another than is signed in here, and of the contract in force: others might
 * no longer be understood.
 * @returns the kept data of the session; undefined: none
 */
export async function restoreAnswers(
  client: QueryClient,
  sessionKey: QueryKey,
  store: Pick<typeof keptStore, 'all'> = keptStore,
): Promise<unknown> {
  const rows = (await store.all()).map(([, kept]) => kept);
  const understood = rows.filter(({ contract }) => contract === CONTRACT);
  const session = understood.find(({ key }) => key[0] === sessionKey[0]);
  if (!session || !isOf(client.getQueryData(sessionKey), session.personId)) return undefined;
  for (const kept of understood)
    if (kept.personId === session.personId && kept !== session) putBack(client, kept);
  return session.data;
}

/** Whether a page may show what a person read: to that one, or where it is not known yet who it is. */
const isOf = (who: unknown, personId: string): boolean =>
  who === undefined ||
  (typeof who === 'object' && who !== null && 'id' in who && who.id === personId);

function putBack(client: QueryClient, { key, data, readAt }: Kept) {
  if (client.getQueryData(key) !== undefined) return;
  // Nothing may show it yet: it waits for as long as the page is open.
  client.getQueryCache().build(client, { queryKey: key, gcTime: Infinity });
  client.setQueryData(key, data, { updatedAt: readAt });
}
