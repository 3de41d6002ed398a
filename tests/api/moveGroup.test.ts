import { inArray } from 'drizzle-orm';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Moved, MoveRequest } from '#shared/api/move.ts';
import type { RecordPage } from '#shared/api/record.ts';
import { api } from '#shared/api/urls.ts';
import { change } from '../../server/db/schema/change.ts';
import { lockSeason } from '../../server/routes/board/locks.ts';
import {
  boardOf,
  good,
  joined,
  namesOn,
  shelve,
  testSeason,
  wish,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Reply, Visitor } from '../support/visitor.ts';
import { Watching } from '../support/watching.ts';

let server: TestServer;
let season: TestSeason;
let brewer: Visitor;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  brewer = await joined(season, 'brewer');
});
afterAll(() => server.close());

const pause = () => new Promise((done) => setTimeout(done, 150));

/** Sends moves while the season is locked: the first works, all others wait and become one group. */
async function meeting(moves: readonly (readonly [Visitor, MoveRequest])[]): Promise<Reply[]> {
  const { id } = (await boardOf(season.head, season.slug)).season;
  const sent: Promise<Reply>[] = [];
  await server.db.transaction(async (tx) => {
    await lockSeason(tx, id);
    for (const [who, request] of moves) {
      sent.push(who.post(api.moves(season.slug), request));
      await pause();
    }
  });
  return Promise.all(sent);
}

it('tells, records and undoes each of the moves that meet', async () => {
  const { head, slug, chainA, chainB } = season;
  const [a = '', b = '', c = '', d = ''] = await shelve(season, chainA, [
    { name: 'Avocet' },
    { name: 'Bittern' },
    { name: 'Curlew' },
    { name: 'Dunlin' },
  ]);
  const { id: seasonId, revision } = (await boardOf(head, slug)).season;
  const onto = { toChainId: chainB, expectedChainId: chainA };
  const first = wish({ batchId: d, ...onto });
  const early = wish({ batchId: c, ...onto, afterBatchId: d });
  const late = wish({ batchId: c, expectedChainId: chainA });
  const other = wish({ batchId: b, ...onto, afterBatchId: c });
  const watching = await Watching.open(brewer, slug, seasonId, revision);
  const replies = await meeting([
    [head, first],
    [head, early],
    [brewer, late],
    [brewer, other],
  ]);
  expect(replies.map(({ status }) => status)).toEqual([200, 200, 409, 200]);

  // Made at one moment: in one transaction.
  const made = await server.db
    .select({ id: change.id, at: change.at })
    .from(change)
    .where(inArray(change.id, [early.id, other.id]));
  expect(made).toHaveLength(2);
  expect(made[0]?.at).toEqual(made[1]?.at);

  const answers = replies.map(({ body }) => body as Moved);
  expect(answers[1]?.revision).toBe(revision + 2);
  expect(answers[3]?.revision).toBe(revision + 3);
  await watching.heard('revision', (told) => told.revision === revision + 3);
  expect(watching.all('revision').map((told) => told.revision)).toEqual([
    revision + 1,
    revision + 2,
    revision + 3,
  ]);
  watching.close();

  expect(replies[2]?.body).toMatchObject({
    type: '/problems/moved-elsewhere',
    detail: expect.stringContaining(`${season.person.name}: Moved Curlew after Dunlin`),
    current: { id: c, chainId: chainB, changedBy: season.person.name },
  });

  const page = await good<RecordPage>(head.get(api.changes(slug, seasonId)));
  expect(page.changes.slice(0, 2)).toMatchObject([
    { id: other.id, what: 'Moved Bittern after Curlew', links: [{ batchId: b }] },
    { id: early.id, what: 'Moved Curlew after Dunlin', links: [{ batchId: c }] },
  ]);
  for (const { links } of page.changes.slice(0, 2))
    expect(links[0]?.to?.verdict).toEqual(expect.any(String));

  await good(brewer.post(api.undo(slug), { changeId: other.id }));
  await good(head.post(api.undo(slug), { changeId: early.id }));
  expect(await namesOn(head, slug, chainA)).toEqual(['Avocet', 'Bittern', 'Curlew']);
  expect(await namesOn(head, slug, chainB)).toEqual(['Dunlin']);
  const { batches } = await boardOf(head, slug);
  expect(batches.filter(({ id }) => [a, b, c, d].includes(id))).toHaveLength(4);
});
