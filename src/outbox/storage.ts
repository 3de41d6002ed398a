import { createStore, get, update, type UseStore } from 'idb-keyval';
import type { Entries } from './queue.ts';
import type { OutboxStorage } from './sendAll.ts';

const KEY = 'entries';

let opened: UseStore | null = null;
const store = () => (opened ??= createStore('barmkin-outbox', 'entries'));

/** On the device, for all tabs: what is written here outlives the page. */
export const deviceStorage: OutboxStorage = {
  read: async () => (await get<Entries>(KEY, store())) ?? [],
  async change(how) {
    let after: Entries = [];
    // One transaction of the database: two tabs take their turns.
    await update<Entries>(KEY, (before = []) => (after = how(before)), store());
    return after;
  },
};
