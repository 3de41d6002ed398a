import type { Query, QueryClient } from '@tanstack/react-query';
import { CONTRACT } from '#shared/api/contract.ts';
import { keptStore, type Kept } from './keptStore.ts';

const BREATH_MS = 300;
/** Boards, batches and runs that were opened last. */
const MOST_KEPT = 80;

interface Ports {
  store: Pick<typeof keptStore, 'all' | 'put' | 'drop' | 'clear'>;
  /** Who is signed in; null: nobody, or not known. */
  person: () => string | null;
  isSession: (query: Pick<Query, 'queryKey'>) => boolean;
}

/** Keeps the last answer of each query that is marked so, for the person who is signed in alone. */
export function keepAnswers(client: QueryClient, { store, person, isSession }: Ports): () => void {
  const waiting = new Map<string, Query>();
  // Whose answers this page has put in, and which: only one more can make them too many.
  let known = { personId: '', hashes: new Set<string>() };
  let timer: ReturnType<typeof setTimeout> | null = null;
  const write = async () => {
    timer = null;
    const personId = person();
    const rows = [...waiting].map(([hash, query]): [string, Kept] => [
      hash,
      keptOf(query, personId),
    ]);
    waiting.clear();
    if (personId === null) return;
    await store.put(rows);
    if (known.personId !== personId) known = { personId, hashes: new Set() };
    if (rows.every(([hash]) => known.hashes.has(hash))) return;
    for (const [hash] of rows) known.hashes.add(hash);
    for (const hash of await dropOthers(store, personId, isSession)) known.hashes.delete(hash);
  };
  const keep = (query: Query) => {
    waiting.set(query.queryHash, query);
    timer ??= setTimeout(write, BREATH_MS);
  };
  // It comes beside the first page: some may have been read before, and nobody may be signed in.
  const sessions = client.getQueryCache().findAll({ predicate: isSession });
  if (sessions.some(({ state }) => state.data === null)) void store.clear();
  for (const query of client.getQueryCache().findAll({ predicate: isKept })) keep(query);
  return client.getQueryCache().subscribe((event) => {
    if (event.type !== 'updated' || event.action.type !== 'success') return;
    const { query } = event;
    if (isSession(query) && query.state.data === null) {
      waiting.clear();
      return void store.clear();
    }
    if (isKept(query)) keep(query);
  });
}

const isKept = (query: Query): boolean =>
  query.meta?.kept === true && query.state.status === 'success';

const keptOf = (query: Query, personId: string | null): Kept => ({
  contract: CONTRACT,
  personId: personId ?? '',
  key: query.queryKey,
  data: query.state.data,
  readAt: query.state.dataUpdatedAt,
});

/**
 * Drops what is somebody else's, and what was read longest ago where there is too much.
 * @returns the hashes of what is gone
 */
async function dropOthers(
  store: Ports['store'],
  personId: string,
  isSession: Ports['isSession'],
): Promise<string[]> {
  const all = await store.all();
  const others = all.filter(([, kept]) => kept.personId !== personId);
  const own = all.filter(([, kept]) => kept.personId === personId);
  const tooMany = own
    // Without the session nothing is found again.
    .filter(([, { key }]) => !isSession({ queryKey: key }))
    .toSorted(([, a], [, b]) => b.readAt - a.readAt)
    .slice(MOST_KEPT);
  const gone = [...others, ...tooMany].map(([hash]) => hash);
  if (gone.length > 0) await store.drop(gone);
  return gone;
}
