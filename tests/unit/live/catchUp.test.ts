import { QueryClient, QueryObserver } from '@tanstack/react-query';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import { boardQuery } from '../../../src/api/board.ts';
import { pendingOf } from '../../../src/api/pendingStore.ts';
import { boardStillness } from '../../../src/api/stillness.ts';
import { createCatchUp } from '../../../src/live/catchUp.ts';
import { twoShelves } from '../lift/board.ts';

const SLUG = 'saltmarsh';
/** The revision that the server's board has, and how often it was read. */
let server = { revision: 1, reads: 0 };
let client: QueryClient;
let stop: () => void;

const boardAt = (revision: number): Board => {
  const board = twoShelves();
  return { ...board, season: { ...board.season, revision } };
};
const shown = () => client.getQueryData(boardQuery(SLUG).queryKey)?.season.revision;

beforeEach(async () => {
  server = { revision: 1, reads: 0 };
  vi.stubGlobal('fetch', async () => {
    server.reads += 1;
    const { revision } = server;
    await new Promise((resolve) => setTimeout(resolve, 5));
    return new Response(JSON.stringify(boardAt(revision)));
  });
  vi.stubGlobal('navigator', { onLine: true });
  client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  client.setQueryData(boardQuery(SLUG).queryKey, boardAt(1));
  stop = new QueryObserver(client, boardQuery(SLUG)).subscribe(() => undefined);
});
afterEach(() => {
  stop();
  pendingOf(SLUG).set([]);
  vi.unstubAllGlobals();
});

it('reads the board where the server is ahead, and not where it is not', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  heard(1);
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect(server.reads).toBe(0);
  server.revision = 3;
  heard(2);
  heard(3);
  await expect.poll(shown).toBe(3);
  expect(server.reads).toBe(1);
});

it('reads again after a read that was under way too early', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  void client.invalidateQueries(boardQuery(SLUG));
  server.revision = 2;
  heard(2);
  await expect.poll(shown).toBe(2);
  expect(server.reads).toBe(2);
});

it('lets moves of one’s own be answered first', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  const move = { id: '', batchId: '', toChainId: 'bench', afterBatchId: null } as const;
  pendingOf(SLUG).set([{ ...move, expectedChainId: null, dates: 'pull' }]);
  server.revision = 2;
  heard(2);
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect(server.reads).toBe(0);
  client.setQueryData(boardQuery(SLUG).queryKey, boardAt(2));
  pendingOf(SLUG).set([]);
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect([server.reads, shown()]).toEqual([0, 2]);
});

it('shows nothing during a drag, looks at the newest all the same, and shows that after it', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  const seen: number[] = [];
  const letGo = boardStillness.hold(({ season }) => seen.push(season.revision));
  for (const revision of [2, 3]) {
    server.revision = revision;
    heard(revision);
    await expect.poll(() => seen).toContain(revision);
  }
  expect(shown()).toBe(1);
  letGo();
  await expect.poll(shown).toBe(3);
  expect(server.reads).toBe(2);
});

it('rests after a failed read, and goes on with the next word', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  const { fetch } = globalThis;
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('lost')));
  server.revision = 2;
  heard(2);
  await expect.poll(() => client.getQueryState(boardQuery(SLUG).queryKey)?.status).toBe('error');
  vi.stubGlobal('fetch', fetch);
  heard(2);
  await expect.poll(shown).toBe(2);
});

it('reads for a chain that is here as a guest, whatever the revision', async () => {
  const { elsewhere } = createCatchUp(client, SLUG, boardAt(1).season.id);
  elsewhere();
  await expect.poll(() => server.reads).toBe(1);
});

it('reads for a guest’s chain at the next heartbeat where the first read failed', async () => {
  const { elsewhere, again } = createCatchUp(client, SLUG, boardAt(1).season.id);
  const { fetch } = globalThis;
  vi.stubGlobal('fetch', () => Promise.reject(new TypeError('lost')));
  elsewhere();
  await expect.poll(() => client.getQueryState(boardQuery(SLUG).queryKey)?.status).toBe('error');
  vi.stubGlobal('fetch', fetch);
  server.revision = 2;
  again();
  await expect.poll(shown).toBe(2);
  again();
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect(server.reads, 'once it was read it is not read again').toBe(1);
});

it('comes to rest where the page with the board has gone, and leaves it marked as old', async () => {
  const { heard } = createCatchUp(client, SLUG, boardAt(1).season.id);
  const { queryKey } = boardQuery(SLUG);
  stop();
  server.revision = 2;
  heard(2);
  await new Promise((resolve) => setTimeout(resolve, 20));
  expect(server.reads).toBe(0);
  expect(client.getQueryState(queryKey)?.isInvalidated).toBe(true);
  stop = new QueryObserver(client, boardQuery(SLUG)).subscribe(() => undefined);
  await expect.poll(shown).toBe(2);
});
