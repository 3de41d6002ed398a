import { QueryClient } from '@tanstack/react-query';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { CONTRACT } from '#shared/api/contract.ts';
import { keepAnswers } from '../../../src/kept/keepAnswers.ts';
import type { Kept } from '../../../src/kept/keptStore.ts';
import { KEPT } from '../../../src/kept/meta.ts';
import { restoreAnswers } from '../../../src/kept/restoreAnswers.ts';

const SESSION = ['session'];

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
  const client = new QueryClient();
  const person = () => client.getQueryData<{ id: string } | null>(SESSION)?.id ?? null;
  keepAnswers(client, { store, person, isSession: ({ queryKey }) => queryKey[0] === 'session' });
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
