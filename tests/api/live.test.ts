import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { eq } from 'drizzle-orm';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { Person } from '#shared/api/people.ts';
import { api } from '#shared/api/urls.ts';
import { membership } from '../../server/db/schema/brewery.ts';
import { presence } from '../../server/db/schema/live.ts';
import { session } from '../../server/db/schema/people.ts';
import { listen } from '../../server/live/listener.ts';
import { startServer } from '../../server/local/serverProcess.mjs';
import { createLog } from '../../server/log.ts';
import {
  boardOf,
  good,
  joined,
  moveTo,
  namesOn,
  shelve,
  testSeason,
  wish,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, TEST_KEYS, type TestServer } from '../support/server.ts';
import { newcomer, PASSWORD, Visitor } from '../support/visitor.ts';
import { Watching } from '../support/watching.ts';

const settings = { HEARTBEAT_SECONDS: '0.3' };
const logs = mkdtempSync(join(tmpdir(), 'barmkin-live-'));
let one: TestServer;
/** A process of its own on the same database. */
let other: ServerProcess;
let season: TestSeason;
let seasonId: string;
let brewer: Visitor;
let batchId: string;
const open: Watching[] = [];
type ServerProcess = Awaited<ReturnType<typeof startServer>>;

beforeAll(async () => {
  one = await startTestServer({ settings });
  other = await startServer(
    {
      ...settings,
      BARMKIN_MODE: 'test',
      DATABASE_URL: one.databaseUrl,
      SESSION_KEYS: TEST_KEYS,
      PORT: '0',
      NODE_ENV: 'production',
    },
    join(logs, 'server.log'),
  );
  season = await testSeason(one.url);
  [batchId = ''] = await shelve(season, season.chainA, [{ name: 'Creek Blonde' }]);
  seasonId = (await boardOf(season.head, season.slug)).season.id;
  brewer = at(other, await joined(season, 'brewer'));
});
afterEach(() => {
  for (const each of open.splice(0)) each.close();
});
afterAll(async () => {
  await other.stop();
  await one.close();
  rmSync(logs, { recursive: true, force: true });
});

/** The same person at another process: the cookie is good at both. */
function at(server: { url: string }, visitor: Visitor): Visitor {
  return new Visitor(server.url, visitor);
}

async function watch(visitor: Visitor, since?: number): Promise<Watching> {
  const watching = await Watching.open(visitor, season.slug, seasonId, since);
  open.push(watching);
  await watching.heard('hello');
  return watching;
}

const revisionNow = async () => (await boardOf(season.head, season.slug)).season.revision;
const idOf = async (visitor: Visitor) => (await good<Person>(visitor.get(api.session))).id;
/** Moves the batch to the shelf that it does not stand on. */
async function moveAcross(visitor: Visitor): Promise<number> {
  const { batches } = await boardOf(visitor, season.slug);
  const from = batches.find(({ id }) => id === batchId)?.chainId ?? null;
  const toChainId = from === season.chainA ? season.chainB : season.chainA;
  return (await moveTo(visitor, season.slug, { batchId, toChainId, expectedChainId: from }))
    .revision;
}

describe('two people at two processes on one database', () => {
  it('tells each of the other’s move and edit at once', async () => {
    const head = await watch(season.head);
    const partner = await watch(brewer);
    const moved = await moveAcross(season.head);
    await partner.heard('revision', ({ revision }) => revision >= moved, 1_000);
    expect(await namesOn(brewer, season.slug, season.chainB)).toEqual(['Creek Blonde']);

    const { version } =
      (await boardOf(brewer, season.slug)).batches.find(({ id }) => id === batchId) ?? {};
    await good(brewer.patch(api.batch(season.slug, batchId), { ibu: 31 }, version));
    const edited = await revisionNow();
    expect(edited).toBe(moved + 1);
    await head.heard('revision', ({ revision }) => revision >= edited, 1_000);
  });

  it('tells nothing of a change that was refused', async () => {
    const partner = await watch(brewer);
    const before = await revisionNow();
    await partner.heard('revision', ({ revision }) => revision === before);
    expect((await season.head.patch(api.batch(season.slug, batchId), { ibu: 1 }, 99)).status).toBe(
      412,
    );
    const moved = await moveAcross(season.head);
    await partner.heard('revision', ({ revision }) => revision >= moved);
    expect(partner.all('revision').map(({ revision }) => revision)).toEqual([before, before + 1]);
  });

  it('says who is here, and who left', async () => {
    const head = await watch(season.head);
    const partner = await watch(brewer);
    const both = [await idOf(season.head), await idOf(brewer)].toSorted();
    const areBoth = ({ people }: { people: string[] }) => people.join() === both.join();
    await head.heard('here', areBoth);
    await partner.heard('here', areBoth);
    head.told.length = 0;
    partner.close();
    expect(await head.heard('here')).toEqual({ people: [await idOf(season.head)] });
  });

  it('forgets whoever was at a process that was killed', async () => {
    const head = await watch(season.head);
    const streamId = '0c0ffee0-0000-4000-8000-000000000001';
    const personId = await idOf(brewer);
    await one.db
      .insert(presence)
      .values({ streamId, seasonId, personId, seenAt: new Date(Date.now()) });
    await head.heard('here', ({ people }) => people.includes(personId));
    head.told.length = 0;
    await head.heard('here', ({ people }) => people.length === 1);
    await expect
      .poll(() => one.db.select().from(presence).where(eq(presence.streamId, streamId)))
      .toEqual([]);
  });
});

describe('a move that no longer fits', () => {
  const name = async (visitor: Visitor) => (await good<Person>(visitor.get(api.session))).name;

  it('is refused with who moved the batch, and to where', async () => {
    const { batches } = await boardOf(season.head, season.slug);
    const seenOn = batches.find(({ id }) => id === batchId)?.chainId ?? null;
    await moveAcross(brewer);
    const late = wish({ batchId, toChainId: 'bench', expectedChainId: seenOn });
    const { status, body } = await season.head.post(api.moves(season.slug), late);
    const who = await name(brewer);
    expect([status, body]).toMatchObject([
      409,
      {
        type: '/problems/moved-elsewhere',
        detail: expect.stringContaining(`${who}: Moved Creek Blonde`),
        current: { id: batchId, changedBy: who },
      },
    ]);
  });

  it('is refused with who deleted the batch', async () => {
    const [gone = ''] = await shelve(season, null, [{ name: 'Ebb Pale' }]);
    const version = (await boardOf(brewer, season.slug)).batches.find(
      ({ id }) => id === gone,
    )?.version;
    await good(brewer.ask('DELETE', api.batch(season.slug, gone), { version: version ?? 0 }));
    const late = wish({ batchId: gone, toChainId: season.chainA, expectedChainId: null });
    const { status, body } = await season.head.post(api.moves(season.slug), late);
    expect([status, body]).toMatchObject([
      404,
      { detail: `${await name(brewer)}: Deleted Ebb Pale` },
    ]);
  });
});

describe('coming back', () => {
  it('replays what was missed, by the revision that was seen last', async () => {
    const before = await revisionNow();
    await moveAcross(season.head);
    const after = await moveAcross(season.head);
    const back = await watch(brewer, before);
    await back.heard('revision');
    expect(back.all('revision')).toEqual([{ revision: after }]);
    expect(back.told.find(({ name }) => name === 'revision')?.id).toBe(String(after));
  });

  it('says no revision to whoever has it', async () => {
    const now = await revisionNow();
    const back = await watch(brewer, now);
    const moved = await moveAcross(season.head);
    await back.heard('revision');
    expect(back.all('revision')).toEqual([{ revision: moved }]);
  });

  it('catches up after the listening connection was lost', async () => {
    const partner = await watch(brewer);
    await partner.heard('revision');
    const { rowCount } = await one.pool.query(`
      select pg_terminate_backend(pid) from pg_stat_activity
      where application_name = 'barmkin live' and datname = current_database()`);
    expect(rowCount).toBe(2);
    // Told while nobody listens, and once more when both listen again.
    const missed = await moveAcross(season.head);
    await partner.heard('revision', ({ revision }) => revision >= missed, 3_000);
    const next = await moveAcross(season.head);
    await partner.heard('revision', ({ revision }) => revision >= next, 3_000);
  });

  it('is kept alive by heartbeats', async () => {
    const partner = await watch(brewer);
    await expect.poll(() => partner.beats).toBeGreaterThan(2);
    expect(partner.all('hello')).toEqual([{ beatMs: 300 }]);
  });

  it('refuses a place that cannot be one', async () => {
    const address = api.seasonEvents(season.slug, seasonId);
    for (const since of ['-1', 'x', '1.5'])
      expect((await brewer.get(`${address}?since=${since}`)).status).toBe(422);
    const { status, headers } = await brewer.ask('HEAD', address);
    expect([status, headers.get('content-encoding')]).toEqual([200, null]);
  });
});

describe('the end', () => {
  it('comes at once with the sign-out, to all streams of that sign-in and to no other', async () => {
    const again = new Visitor(other.url);
    await good(again.post(api.session, { email: season.person.email, password: PASSWORD }));
    const stays = await watch(season.head);
    const here = await watch(again);
    const there = await watch(at(one, again));
    await good(again.ask('DELETE', api.session));
    for (const each of [here, there]) {
      expect(await each.heard('ended', undefined, 1_000)).toEqual({ why: 'signed-out' });
      await each.ended();
    }
    expect([stays.isEnded, stays.all('ended')]).toEqual([false, []]);
  });

  it('comes with the next heartbeat where a sign-in ran out or was taken away', async () => {
    const leaver = await joined(season, 'taster');
    const watching = await watch(leaver);
    await one.db.delete(session).where(eq(session.personId, await idOf(leaver)));
    expect(await watching.heard('ended')).toEqual({ why: 'signed-out' });
    await watching.ended();
  });

  it('comes with the end of a membership', async () => {
    const leaver = await joined(season, 'taster');
    const watching = await watch(leaver);
    await one.db.delete(membership).where(eq(membership.personId, await idOf(leaver)));
    expect(await watching.heard('ended')).toEqual({ why: 'not-a-member' });
    await watching.ended();
    expect((await leaver.get(api.seasonEvents(season.slug, seasonId))).status).toBe(404);
  });

  /** Somebody who watches from two browsers, at two processes. */
  async function twice() {
    const there = await joined(season, 'brewer');
    const { id, email } = await good<Person>(there.get(api.session));
    const again = new Visitor(other.url);
    await good(again.post(api.session, { email, password: PASSWORD }));
    const streams = [await watch(there), await watch(again)] as const;
    return { there, id, streams };
  }

  it.each([
    [
      'a password that was changed elsewhere',
      (by: Visitor) =>
        by.ask('PUT', api.accountPassword, {
          body: { password: PASSWORD, newPassword: 'another long sentence' },
        }),
    ],
    ['a sign-out from elsewhere', (by: Visitor) => by.ask('DELETE', api.signIns)],
  ])('comes at once with %s, but not here', async (_, act) => {
    const { there, streams } = await twice();
    const [here, elsewhere] = streams;
    await good(act(there));
    expect(await elsewhere.heard('ended', undefined, 1_000)).toEqual({ why: 'signed-out' });
    await elsewhere.ended();
    expect([here.isEnded, here.all('ended')]).toEqual([false, []]);
  });

  it('comes at once to somebody who is removed, wherever they watch', async () => {
    const { id, streams } = await twice();
    const version = 1;
    await good(season.head.ask('DELETE', api.member(season.slug, id), { version }));
    for (const each of streams) {
      expect(await each.heard('ended', undefined, 1_000)).toEqual({ why: 'not-a-member' });
      await each.ended();
    }
  });

  it('comes at once with a closed account', async () => {
    const { there, streams } = await twice();
    await good(there.post(api.accountClosing, { password: PASSWORD, losing: [] }));
    for (const each of streams)
      expect(await each.heard('ended', undefined, 1_000)).toHaveProperty('why');
  });

  it('is not reached by somebody else’s season', async () => {
    const { visitor, slug } = await newcomer(one.url);
    expect((await visitor.get(api.seasonEvents(slug, seasonId))).status).toBe(404);
    expect((await visitor.get(api.seasonEvents(season.slug, seasonId))).status).toBe(404);
  });

  it('comes to the oldest where one sign-in opens too many', async () => {
    const watchings: Watching[] = [];
    for (let count = 0; count < 9; count += 1) watchings.push(await watch(season.head));
    await watchings[0]?.ended();
    expect(watchings.map(({ isEnded }) => isEnded)).toEqual([true, ...Array(8).fill(false)]);
  });

  it('comes with the stop of a process, which waits for nobody', async () => {
    const third = await startTestServer({ settings, database: { ...one, url: one.databaseUrl } });
    const watching = await watch(at(third, season.head));
    await third.close();
    await watching.ended();
    expect(watching.all('ended')).toEqual([]);
  });

  it('comes to a process that does not listen yet', async () => {
    const noted: unknown[] = [];
    const listener = listen(one.databaseUrl, {
      log: createLog('error'),
      onNote: (note) => noted.push(note),
      onListening: () => noted.push('listening'),
    });
    await listener.close();
    expect(noted).toEqual([]);
  });
});
