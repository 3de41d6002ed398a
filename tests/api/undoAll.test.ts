import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { afterAll, beforeAll, expect, it } from 'vitest';
import type { Board } from '#shared/api/board.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain, aVessel, aYeast } from '../support/bodies.ts';
import { boardOf, good, shelve, testSeason, wish, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Reply } from '../support/visitor.ts';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

/** What a step does to the board as it stands; `nr` chooses among what is there. */
type Step = (season: TestSeason, board: Board, nr: number) => Promise<Reply> | null;

const pick = <T>(rows: readonly T[], nr: number): T | undefined => rows[nr % rows.length];

const STEPS: Record<string, Step> = {
  addBatch: ({ head, slug }, _board, nr) =>
    head.post(api.batches(slug), aBatch({ name: `New ${nr}` })),
  editBatch: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    const body =
      nr % 2 ? { ibu: nr, typed: { ibu: { text: `${nr}`, unit: 'IBU' } } } : { og: 1.05 };
    return row ? head.patch(api.batch(slug, row.id), body, row.version) : null;
  },
  editLink: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    const body = nr % 2 ? { keepL: 0.3 } : { keepWhole: true };
    return row ? head.patch(api.link(slug, row.id), body, row.version) : null;
  },
  deleteBatch: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    return row ? head.ask('DELETE', api.batch(slug, row.id), { version: row.version }) : null;
  },
  stage: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    const bodies = [
      { stage: 'fermenting', brewedOn: '2027-03-06', volumeL: 22, og: 1.05 },
      { stage: 'racked', rackedOn: '2027-03-20', volumeL: 21, fg: 1.01 },
      { stage: 'scrapped', reason: 'spilt' },
      { stage: 'pencilled' },
    ];
    const body = pick(bodies, Math.floor(nr / 7));
    return row ? head.post(api.batchStage(slug, row.id), body, row.version) : null;
  },
  accept: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    const body = { reason: 'On purpose' };
    return row
      ? head.ask('PUT', api.acceptance(slug, row.id), { body, version: row.version })
      : null;
  },
  move: ({ head, slug }, board, nr) => {
    const row = pick(board.batches, nr);
    const shelf = pick([...board.chains.map(({ id }) => id), 'bench' as const], nr >> 3);
    const mates = board.batches.filter(({ chainId, id }) => chainId === shelf && id !== row?.id);
    if (!row || shelf === undefined) return null;
    const afterBatchId = shelf === 'bench' ? null : (pick(mates, nr >> 5)?.id ?? null);
    return head.post(
      api.moves(slug),
      wish({ batchId: row.id, toChainId: shelf, afterBatchId, expectedChainId: row.chainId }),
    );
  },
  addChain: ({ head, slug }, board, nr) => {
    const yeast = pick(board.yeasts, nr);
    return yeast ? head.post(api.chains(slug), aChain(yeast.id, { name: `Shelf ${nr}` })) : null;
  },
  editChain: ({ head, slug }, board, nr) => {
    const row = pick(board.chains, nr);
    const source = pick(board.batches, nr >> 2);
    const bodies = [
      { position: nr % 4 },
      { name: `Shelf ${nr}`, vesselId: null },
      ...(source ? [{ start: { kind: 'cake', batchId: source.id } }] : []),
      { start: { kind: 'pack', price: nr } },
    ];
    const body = pick(bodies, nr >> 4);
    return row ? head.patch(api.chain(slug, row.id), body, row.version) : null;
  },
  deleteChain: ({ head, slug }, board, nr) => {
    const row = pick(board.chains, nr);
    return row ? head.ask('DELETE', api.chain(slug, row.id), { version: row.version }) : null;
  },
  pull: ({ head, slug }, board, nr) => {
    const row = pick(board.chains, nr);
    return row ? head.post(api.pullDates(slug, row.id), undefined) : null;
  },
  stock: ({ head, slug }, board, nr) => {
    const [yeast, vessel] = [pick(board.yeasts, nr), pick(board.vessels, nr)];
    if (nr % 5 === 0) return head.post(api.yeasts(slug), aYeast({ id: randomUUID() }));
    if (nr % 5 === 1) return head.post(api.vessels(slug), aVessel({ id: randomUUID() }));
    if (nr % 5 === 2 && yeast)
      return head.ask('DELETE', api.yeast(slug, yeast.id), { version: yeast.version });
    if (nr % 5 === 3 && vessel)
      return head.ask('DELETE', api.vessel(slug, vessel.id), { version: vessel.version });
    return yeast
      ? head.patch(api.yeast(slug, yeast.id), { generationLimit: (nr % 9) + 1 }, yeast.version)
      : null;
  },
  season: ({ head, slug }, { season }, nr) =>
    head.patch(
      api.season(slug, season.id),
      { blockedDays: [`2027-04-${10 + (nr % 20)}`], brewsPerDay: (nr % 3) + 1 },
      season.version,
    ),
  houseRules: ({ head, slug }, _board, nr) =>
    head.get(api.houseRules(slug)).then(({ body }) =>
      head.ask('PUT', api.houseRules(slug), {
        body: { darkSrm: nr % 9 },
        version: (body as { version: number }).version,
      }),
    ),
};

/** A board without what is only counted, its rows in an order of their own. */
function standing(board: Board): unknown {
  const bare = <T extends { id: string; version: number }>(rows: readonly T[]) =>
    rows
      .map(({ version: _, ...row }) => row)
      .toSorted((x, y) => (x.id < y.id ? -1 : x.id > y.id ? 1 : 0));
  const { id, name, brewWeekdays, brewsPerDay, blockedDays } = board.season;
  return {
    season: { id, name, brewWeekdays, brewsPerDay, blockedDays },
    houseRules: board.houseRules,
    batches: bare(board.batches),
    chains: bare(board.chains),
    yeasts: bare(board.yeasts),
    vessels: bare(board.vessels),
  };
}

async function turnAll(way: 'undo' | 'redo', { head, slug }: TestSeason): Promise<number> {
  for (let turns = 0; ; turns += 1) {
    const board = await boardOf(head, slug);
    const change = board[way];
    if (!change) return turns;
    await good(head.post(api[way](slug), { changeId: change.id }));
  }
}

const steps = fc.array(
  fc.record({
    step: fc.constantFrom(...Object.keys(STEPS)),
    nr: fc.nat({ max: 997 }),
  }),
  { minLength: 12, maxLength: 30 },
);

it('any edits and moves, all undone, leave the board as it was, and all redone as it became', async () => {
  let changes = 0;
  await fc.assert(
    fc.asyncProperty(steps, async (wishes) => {
      const season = await testSeason(server.url);
      await shelve(season, season.chainA, [
        { name: 'Avocet', og: 1.095, fg: 1.02, brewOn: '2027-03-06' },
        { name: 'Bittern' },
        { name: 'Curlew' },
      ]);
      await shelve(season, null, [{ name: 'Dunlin' }, { name: 'Egret' }]);
      const first = await boardOf(season.head, season.slug);
      for (const { step, nr } of wishes) {
        const board = await boardOf(season.head, season.slug);
        const reply = await STEPS[step]?.(season, board, nr);
        expect(reply?.status ?? 200).toBeLessThan(500);
      }
      const end = standing(await boardOf(season.head, season.slug));
      const undone = await turnUntil(season, first);
      changes += undone;
      expect(standing(await boardOf(season.head, season.slug))).toEqual(standing(first));
      for (let left = undone; left > 0; left -= 1) {
        const { redo } = await boardOf(season.head, season.slug);
        await good(season.head.post(api.redo(season.slug), { changeId: redo?.id }));
      }
      expect(standing(await boardOf(season.head, season.slug))).toEqual(end);
      await turnAll('undo', season);
      const empty = await boardOf(season.head, season.slug);
      expect([empty.batches, empty.chains, empty.yeasts]).toEqual([[], [], []]);
    }),
    { numRuns: 5, seed: 20270306 },
  );
  expect(changes).toBeGreaterThan(30);
}, 120_000);

/** Undoes until the newest change is the one that was the newest then. */
async function turnUntil({ head, slug }: TestSeason, first: Board): Promise<number> {
  for (let turns = 0; ; turns += 1) {
    const { undo } = await boardOf(head, slug);
    if (!undo || undo.id === first.undo?.id) return turns;
    await good(head.post(api.undo(slug), { changeId: undo.id }));
  }
}
