import type { QueryKey } from '@tanstack/react-query';
import { clear, createStore, delMany, entries, setMany, type UseStore } from 'idb-keyval';

/** An answer of the server as it was last read, for when there is no connection. */
export interface Kept {
  contract: number;
  personId: string;
  key: QueryKey;
  data: unknown;
  /** When it was read, ms since 1970. */
  readAt: number;
}

let opened: UseStore | null = null;
const store = () => (opened ??= createStore('barmkin-kept', 'answers'));

/** A browser may shut its storage off: the pages then need a connection, and work as ever with one. */
async function quietly<T>(work: () => Promise<T>, otherwise: T): Promise<T> {
  try {
    return await work();
  } catch {
    return otherwise;
  }
}

export const keptStore = {
  all: (): Promise<[string, Kept][]> => quietly(() => entries<string, Kept>(store()), []),
  put: (rows: [string, Kept][]) => quietly(() => setMany(rows, store()), undefined),
  drop: (hashes: string[]) => quietly(() => delMany(hashes, store()), undefined),
  clear: () => quietly(() => clear(store()), undefined),
};
