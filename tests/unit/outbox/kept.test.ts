import { QueryClient } from '@tanstack/react-query';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { CONTRACT } from '#shared/api/contract.ts';
import { keepAnswers } from '../../../src/kept/keepAnswers.ts';
import type { Kept } from '../../../src/kept/keptStore.ts';
import { KEPT } from '../../../src/kept/meta.ts';
import { restoreAnswers } from '../../../src/kept/restoreAnswers.ts';

const SESSION = ['session'];

const isSession = ({ queryKey }: { queryKey: readonly unknown[] }) => queryKey[0] === 'session';
const OF_ORLA = { contract: CONTRACT, personId: 'orla', readAt: 1 };

/** As in a browser, where what nobody looks at is given up after five minutes. */
const browserClient = () =>
  new QueryClient({ defaultOptions: { queries: { gcTime: 5 * 60_000 } } });

/** Storage of a device, in memory. */
function device() {
  const rows = new Map<string, Kept>();
  return {
    rows,
    all: async () => [...rows],
    put: async (more: [string, Kept][]) => more.forEach(([hash, row]) => rows.set(hash, row)),
    drop: async (hashes: string[]) => hashes.forEach((hash) => rows.delete(hash)),
    clear: async () => rows.clear(),
  };
}

function page(store: ReturnType<typeof device>) {
  const client = browserClient();
  const person = () => client.getQueryData<{ id: string } | null>(SESSION)?.id ?? null;
  keepAnswers(client, { store, person, isSession });
  const read = (key: string[], data: unknown, kept = true) =>
    client.fetchQuery({ queryKey: key, queryFn: () => data, ...(kept && KEPT) });
  return { client, read };
}

const breath = () => vi.advanceTimersByTimeAsync(1000);

describe('what is kept for when there is no connection', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('is what was marked so, with whom and when, and comes back on a new start', async () => {
    const store = device();
    const { read } = page(store);
    vi.setSystemTime('2027-03-20T14:05:00Z');
    await read(SESSION, { id: 'orla' });
    await read(['board', 'reedbed'], { beers: 3 });
    await read(['people', 'reedbed'], ['secret'], false);
    await breath();
    expect([...store.rows.values()].map(({ key }) => key)).toEqual([SESSION, ['board', 'reedbed']]);

    const later = new QueryClient();
    expect(await restoreAnswers(later, SESSION, store)).toEqual({ id: 'orla' });
    expect(later.getQueryData(['board', 'reedbed'])).toEqual({ beers: 3 });
    expect(later.getQueryState(['board', 'reedbed'])?.dataUpdatedAt).toBe(
      Date.parse('2027-03-20T14:05:00Z'),
    );
  });

  it('goes when nobody is signed in any more', async () => {
    const store = device();
    const { read, client } = page(store);
    await read(SESSION, { id: 'orla' });
    await read(['board', 'reedbed'], { beers: 3 });
    await breath();
    client.clear();
    client.setQueryData(SESSION, null);
    await breath();
    expect(store.rows.size).toBe(0);
  });

  it('of one person never shows to another', async () => {
    const store = device();
    const first = page(store);
    await first.read(SESSION, { id: 'orla' });
    await first.read(['board', 'reedbed'], { beers: 3 });
    await breath();
    const second = page(store);
    await second.read(SESSION, { id: 'ned' });
    await breath();
    const later = new QueryClient();
    expect(await restoreAnswers(later, SESSION, store)).toEqual({ id: 'ned' });
    expect(later.getQueryData(['board', 'reedbed'])).toBeUndefined();
  });

  it('under another contract is left alone', async () => {
    const store = device();
    const old = { contract: CONTRACT + 1, personId: 'orla', readAt: 1 };
    store.rows.set('s', { ...old, key: SESSION, data: { id: 'orla' } });
    expect(await restoreAnswers(new QueryClient(), SESSION, store)).toBeUndefined();
  });

  it('never takes the place of something newer', async () => {
    const store = device();
    const { read } = page(store);
    await read(SESSION, { id: 'orla' });
    await read(['board', 'reedbed'], { beers: 3 });
    await breath();
    const later = new QueryClient();
    later.setQueryData(['board', 'reedbed'], { beers: 4 });
    await restoreAnswers(later, SESSION, store);
    expect(later.getQueryData(['board', 'reedbed'])).toEqual({ beers: 4 });
  });

  it('goes on the start of a page for which nobody is signed in', async () => {
    const store = device();
    store.rows.set('b', { ...OF_ORLA, key: ['board', 'reedbed'], data: { beers: 3 } });
    const client = new QueryClient();
    client.setQueryData(SESSION, null);
    keepAnswers(client, { store, person: () => null, isSession });
    await breath();
    expect(store.rows.size).toBe(0);
  });

  it('comes back into an open page, for whoever is signed in there alone', async () => {
    const store = device();
    store.rows.set('s', { ...OF_ORLA, key: SESSION, data: { id: 'orla' } });
    store.rows.set('b', { ...OF_ORLA, key: ['board', 'reedbed'], data: { beers: 3 } });
    const shows = async (person: unknown) => {
      const client = browserClient();
      client.setQueryData(SESSION, person);
      await restoreAnswers(client, SESSION, store);
      // Long after what nobody looks at is given up.
      await vi.advanceTimersByTimeAsync(60 * 60_000);
      return client.getQueryData(['board', 'reedbed']);
    };
    expect(await shows({ id: 'orla' })).toEqual({ beers: 3 });
    expect(await shows({ id: 'ned' })).toBeUndefined();
    expect(await shows(null)).toBeUndefined();
  });

  it('stays in an open page that looks at something else for long', async () => {
    const { read, client } = page(device());
    await read(['board', 'reedbed'], { beers: 3 });
    await read(['people', 'reedbed'], ['Orla'], false);
    await vi.advanceTimersByTimeAsync(60 * 60_000);
    expect(client.getQueryData(['board', 'reedbed'])).toEqual({ beers: 3 });
    expect(client.getQueryData(['people', 'reedbed'])).toBeUndefined();
  });

  it('is looked over where something new came in, not at each read', async () => {
    const store = device();
    const all = vi.spyOn(store, 'all');
    const { read } = page(store);
    await read(SESSION, { id: 'orla' });
    for (const beers of [3, 4, 5]) {
      await read(['board', 'reedbed'], { beers });
      await breath();
    }
    expect(all).toHaveBeenCalledOnce();
    expect([...store.rows.values()].map(({ data }) => data)).toContainEqual({ beers: 5 });
    await read(['batch', 'creek'], 1);
    await breath();
    expect(all).toHaveBeenCalledTimes(2);
  });

  it('keeps to what was read last', async () => {
    const store = device();
    const { read } = page(store);
    await read(SESSION, { id: 'orla' });
    for (let at = 0; at < 120; at += 1) {
      await read(['batch', String(at)], at);
      await breath();
    }
    expect(store.rows.size).toBeLessThanOrEqual(81);
    expect([...store.rows.values()].some(({ key }) => key[0] === 'session')).toBe(true);
    expect([...store.rows.values()].some(({ data }) => data === 119)).toBe(true);
    expect([...store.rows.values()].some(({ data }) => data === 3)).toBe(false);
  });
});
