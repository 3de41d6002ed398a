import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { moved as contract, type Moved } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain } from '../support/bodies.ts';
import {
  batchOf,
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
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let a = '';
let b = '';
let c = '';

beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  [a = '', b = '', c = ''] = await shelve(season, season.chainA, [
    { name: 'A', brewOn: '2027-03-06' },
    { name: 'B' },
    { name: 'C' },
  ]);
});

const on = (chainId: string | null) => namesOn(season.head, season.slug, chainId);
const undo = (visitor: Visitor, changeId: string) =>
  visitor.post(api.undo(season.slug), { changeId });
const redo = (visitor: Visitor, changeId: string) =>
  visitor.post(api.redo(season.slug), { changeId });

describe('a move', () => {
  it('stores order and dates together, and says what it did', async () => {
    expect((await batchOf(season.head, season.slug, c)).brewOn).toBe('2027-04-03');
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      toChainId: season.chainA,
      afterBatchId: a,
      expectedChainId: season.chainA,
    });
    expect(contract.parse(answer).what).toBe('Moved C after A');
    expect(await on(season.chainA)).toEqual(['A', 'C', 'B']);
    expect((await batchOf(season.head, season.slug, c)).brewOn).toBe('2027-03-20');
    expect(new Set(answer.shifted.map(({ batchId }) => batchId))).toEqual(new Set([b, c]));
    expect(answer.undo?.what).toBe('Moved C after A');
    const board = await boardOf(season.head, season.slug);
    expect(board.undo).toEqual(answer.undo);
    expect(board.season.revision).toBe(answer.revision);
    for (const row of answer.batches)
      expect(board.batches.find(({ id }) => id === row.id)).toEqual(row);
  });

  it('answers a repeated request again, and moves once', async () => {
    const body = wish({ batchId: c, expectedChainId: season.chainA });
    const first = await good<Moved>(season.head.post(api.moves(season.slug), body));
    const again = await good<Moved>(season.head.post(api.moves(season.slug), body));
    expect(again).toMatchObject({
      changeId: first.changeId,
      what: first.what,
      revision: first.revision,
    });
    expect(await on(null)).toEqual(['C']);
    const record = await server.pool.query('select 1 from change where id = $1', [body.id]);
    expect(record.rows).toHaveLength(1);
  });

  it('sent twice at once moves once', async () => {
    const body = wish({ batchId: c, toChainId: season.chainB, expectedChainId: season.chainA });
    const ask = () => season.head.post(api.moves(season.slug), body);
    const statuses = (await Promise.all([ask(), ask(), ask()])).map(({ status }) => status);
    expect(statuses).toEqual([200, 200, 200]);
    expect(await on(season.chainB)).toEqual(['C']);
  });

  it('that already stands changes nothing', async () => {
    const { revision } = (await boardOf(season.head, season.slug)).season;
    const answer = await moveTo(season.head, season.slug, {
      batchId: b,
      toChainId: season.chainA,
      afterBatchId: a,
      expectedChainId: season.chainB,
    });
    expect(answer).toMatchObject({ revision, batches: [] });
  });

  it('from a wrong place is refused with where the batch is', async () => {
    const body = wish({ batchId: c, toChainId: season.chainB, expectedChainId: null });
    const { status, body: document } = await season.head.post(api.moves(season.slug), body);
    expect(status).toBe(409);
    expect(document).toMatchObject({
      type: '/problems/moved-elsewhere',
      current: { id: c, chainId: season.chainA, place: 2 },
    });
  });

  it('after a batch that is gone is refused', async () => {
    const wishes = { batchId: c, toChainId: season.chainB, afterBatchId: a };
    const body = wish({ ...wishes, expectedChainId: season.chainA });
    const { status, body: document } = await season.head.post(api.moves(season.slug), body);
    expect([status, document]).toMatchObject([409, { type: '/problems/place-taken' }]);
  });

  it('can put up a shelf, and its undo takes the shelf down', async () => {
    const newChain = aChain(season.yeastId, { name: 'New shelf' });
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      toChainId: 'new',
      expectedChainId: season.chainA,
      newChain,
    });
    const board = await boardOf(season.head, season.slug);
    expect(answer.chains).toEqual(board.chains.filter(({ id }) => id === newChain.id));
    expect(await on(newChain.id)).toEqual(['C']);
    const undone = await good<Moved>(undo(season.head, answer.changeId));
    expect(undone.removedChainIds).toEqual([newChain.id]);
    expect(await on(season.chainA)).toEqual(['A', 'B', 'C']);
    expect((await boardOf(season.head, season.slug)).chains).toHaveLength(2);
    await good(redo(season.head, answer.changeId));
    expect(await on(newChain.id)).toEqual(['C']);
  });

  it('to a shelf of a yeast that is not the brewery’s is refused at the field', async () => {
    const other = await testSeason(server.url);
    const newChain = aChain(other.yeastId);
    const body = wish({ batchId: c, toChainId: 'new', expectedChainId: season.chainA, newChain });
    const { status, body: document } = await season.head.post(api.moves(season.slug), body);
    expect(status).toBe(422);
    expect(document).toMatchObject({ errors: [{ pointer: '/newChain/yeastId' }] });
    expect((await boardOf(season.head, season.slug)).chains).toHaveLength(2);
  });

  it('of a brewed batch is refused', async () => {
    const { version } = await batchOf(season.head, season.slug, a);
    const stage = { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 23, og: 1.044 };
    await good(season.head.post(api.batchStage(season.slug, a), stage, version));
    const body = wish({ batchId: a, expectedChainId: season.chainA });
    expect((await season.head.post(api.moves(season.slug), body)).status).toBe(409);
    const before = wish({
      batchId: c,
      toChainId: season.chainA,
      expectedChainId: season.chainA,
      afterBatchId: null,
    });
    expect((await season.head.post(api.moves(season.slug), before)).status).toBe(409);
  });
});

describe('undo and redo', () => {
  it('bring order, dates and the kept part back, also after a reload', async () => {
    const { version } = await batchOf(season.head, season.slug, c);
    await good(season.head.patch(api.link(season.slug, c), { keepL: 0.4 }, version));
    const before = (await boardOf(season.head, season.slug)).batches;
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      toChainId: season.chainB,
      expectedChainId: season.chainA,
    });
    expect(answer.cleared).toContain(c);
    const after = (await boardOf(season.head, season.slug)).batches;
    const { undo: newest } = await boardOf(season.head, season.slug);
    const undone = await good<Moved>(undo(season.head, newest?.id ?? ''));
    expect(contract.parse(undone).undo?.what).toBe(
      'Set the kept part of the cake under C from the recommended part to 400 mL',
    );
    expect(undone.redo?.id).toBe(answer.changeId);
    const same = (rows: typeof before) => rows.map((row) => ({ ...row, version: 0 }));
    expect(same((await boardOf(season.head, season.slug)).batches)).toEqual(same(before));
    const redone = await good<Moved>(redo(season.head, answer.changeId));
    expect(redone.redo).toBeNull();
    expect(same((await boardOf(season.head, season.slug)).batches)).toEqual(same(after));
  });

  it('go through one’s own moves, newest first', async () => {
    const moves: string[] = [];
    for (const batchId of [c, b, a]) {
      const answer = await moveTo(season.head, season.slug, {
        batchId,
        expectedChainId: season.chainA,
      });
      moves.push(answer.changeId);
    }
    expect(await on(null)).toEqual(['A', 'B', 'C']);
    expect((await undo(season.head, moves[0] ?? '')).status).toBe(409);
    for (const id of moves.toReversed()) await good(undo(season.head, id));
    expect(await on(season.chainA)).toEqual(['A', 'B', 'C']);
    for (const id of moves) await good(redo(season.head, id));
    expect(await on(null)).toEqual(['A', 'B', 'C']);
  });

  it('answer a repeated request again, and do it once', async () => {
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      expectedChainId: season.chainA,
    });
    const first = await good<Moved>(undo(season.head, answer.changeId));
    const again = await good<Moved>(undo(season.head, answer.changeId));
    expect(again).toMatchObject({ changeId: first.changeId, revision: first.revision });
    expect(await on(season.chainA)).toEqual(['A', 'B', 'C']);
  });

  it('put a batch back where it was on the bench', async () => {
    const [x = ''] = await shelve(season, null, [{ name: 'X' }, { name: 'Y' }, { name: 'Z' }]);
    const answer = await moveTo(season.head, season.slug, {
      batchId: x,
      toChainId: season.chainB,
    });
    await good(undo(season.head, answer.changeId));
    expect(await on(null)).toEqual(['X', 'Y', 'Z']);
  });

  it('are one’s own', async () => {
    const brewer = await joined(season, 'brewer');
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      expectedChainId: season.chainA,
    });
    expect((await boardOf(brewer, season.slug)).undo).toBeNull();
    const theirs = await undo(brewer, answer.changeId);
    expect(theirs.body).toMatchObject({ type: '/problems/not-undoable' });
    expect(await on(null)).toEqual(['C']);
  });

  it('are refused with who did what since, where somebody changed the same thing', async () => {
    const brewer = await joined(season, 'brewer');
    const answer = await moveTo(season.head, season.slug, {
      batchId: c,
      expectedChainId: season.chainA,
    });
    await moveTo(brewer, season.slug, { batchId: c, toChainId: season.chainB });
    const { status, body } = await undo(season.head, answer.changeId);
    expect(status).toBe(409);
    expect(body).toMatchObject({ type: '/problems/not-undoable', current: { id: c } });
    expect((body as { detail: string }).detail).toContain(
      'The brewer: Moved C to the start of Shelf B',
    );
    expect(await on(season.chainB)).toEqual(['C']);
  });

  it('leave what others did elsewhere on the shelf alone', async () => {
    const brewer = await joined(season, 'brewer');
    const answer = await moveTo(season.head, season.slug, {
      batchId: a,
      expectedChainId: season.chainA,
    });
    const body = aBatch({ name: 'Late' });
    await good(brewer.post(api.batches(season.slug), body));
    await moveTo(brewer, season.slug, {
      batchId: body.id,
      toChainId: season.chainA,
      afterBatchId: c,
    });
    await good(undo(season.head, answer.changeId));
    expect(await on(season.chainA)).toEqual(['A', 'B', 'C', 'Late']);
  });

  it('end redoing at a new change', async () => {
    const first = await moveTo(season.head, season.slug, {
      batchId: c,
      expectedChainId: season.chainA,
    });
    await good(undo(season.head, first.changeId));
    const board = await boardOf(season.head, season.slug);
    expect(board.redo?.id).toBe(first.changeId);
    await moveTo(season.head, season.slug, { batchId: b, expectedChainId: season.chainA });
    expect((await boardOf(season.head, season.slug)).redo).toBeNull();
    expect((await redo(season.head, first.changeId)).status).toBe(409);
  });

  it('know nothing of a change that never was', async () => {
    expect((await undo(season.head, randomUUID())).status).toBe(409);
  });
});

describe('the change record', () => {
  it('only grows', async () => {
    for (const statement of ['update change set what = $1', 'delete from change where what <> $1'])
      await expect(server.pool.query(statement, ['x'])).rejects.toThrow('append-only');
    await expect(server.pool.query('truncate change cascade')).rejects.toThrow('append-only');
  });
});
