import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { board as contract } from '#shared/api/board.ts';
import { judgeBoard } from '#shared/chain/judgeBoard.ts';
import type { ListedSeason } from '#shared/api/brewery.ts';
import type { Talk } from '#shared/api/comment.ts';
import { api, placeOf } from '#shared/api/urls.ts';
import { dayIn } from '../../server/today.ts';
import { DEMO_PASSWORD, DEMO_PEOPLE } from '../../server/db/demo/people.ts';
import { firstBrewDay, seedDemo } from '../../server/db/seed.ts';
import { testClock } from '../support/clock.ts';
import { boardOf, good, shelve, testSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import { newcomer, Visitor } from '../support/visitor.ts';

const clock = testClock('2027-03-29T22:30:00Z');
let server: TestServer;

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());

/** Statements that reached the database while something ran. */
async function statementsOf(run: () => Promise<unknown>): Promise<string[]> {
  const seen: string[] = [];
  const client = await server.pool.connect();
  client.release();
  const prototype: Client = Object.getPrototypeOf(client);
  const query = prototype.query;
  prototype.query = function (...args: unknown[]) {
    const [first] = args;
    const text =
      typeof first === 'object' && first !== null && 'text' in first ? first.text : first;
    seen.push(String(text));
    return query.apply(this, args);
  };
  try {
    await run();
  } finally {
    prototype.query = query;
  }
  return seen;
}
interface Client {
  query(...args: unknown[]): unknown;
}

describe('the board', () => {
  it('is sent packed once it is large; an answer that fits into the first flight goes bare', async () => {
    const season = await testSeason(server.url);
    const packed = async (url: string) => {
      const { headers } = await season.head.get(url);
      return headers.get('content-encoding');
    };
    expect(await packed(api.session)).toBeNull();
    const many = Array.from({ length: 25 }, (_, nth) => ({ name: `Large ${nth}` }));
    await shelve(season, null, many);
    expect(await packed(api.board(season.slug))).toBe('gzip');
  });

  it('answers by its contract, in at most four statements whatever its size', async () => {
    const season = await testSeason(server.url);
    const names = Array.from({ length: 12 }, (_, each) => ({ name: `Batch ${each}` }));
    await shelve(season, season.chainA, names.slice(0, 6));
    await shelve(season, null, names.slice(6));
    await boardOf(season.head, season.slug);
    const board = contract.parse(await boardOf(season.head, season.slug));
    expect(board.batches).toHaveLength(12);
    expect(board.chains.map(({ name }) => name)).toEqual(['Shelf A', 'Shelf B']);
    const statements = await statementsOf(() => boardOf(season.head, season.slug));
    const whoAsks = statements.filter((text) => /(from|join) "session"|from "brewery"/.test(text));
    expect(whoAsks).toHaveLength(1);
    expect(statements.length - whoAsks.length).toBeLessThanOrEqual(4);
    expect(statements.length - whoAsks.length).toBeGreaterThan(0);
  });

  it('says today in the brewery’s time zone', async () => {
    const { visitor, slug } = await newcomer(server.url);
    expect((await boardOf(visitor, slug)).today).toBe('2027-03-29');
    const edited = await visitor.patch(api.brewery(slug), { timeZone: 'Pacific/Auckland' }, 1);
    expect(edited.status).toBe(200);
    expect((await boardOf(visitor, slug)).today).toBe('2027-03-30');
    const nowhere = await visitor.patch(api.brewery(slug), { timeZone: 'Nowhere/Land' }, 2);
    expect(nowhere.status).toBe(422);
    expect(nowhere.body).toMatchObject({ errors: [{ pointer: '/timeZone' }] });
  });

  it('raises the revision with every change', async () => {
    const season = await testSeason(server.url);
    const before = (await boardOf(season.head, season.slug)).season.revision;
    await shelve(season, null, [{ name: 'One' }]);
    expect((await boardOf(season.head, season.slug)).season.revision).toBe(before + 1);
  });
});

describe('the demo', () => {
  beforeAll(() => seedDemo(server.db, clock));

  const signedIn = async (email: string) => {
    const visitor = new Visitor(server.url);
    await good(visitor.post(api.session, { email, password: DEMO_PASSWORD }));
    return visitor;
  };

  it('has three people who can sign in, each in a role', async () => {
    const roles = [];
    for (const { email } of DEMO_PEOPLE) {
      const board = await boardOf(await signedIn(email), 'saltmarsh-brewers');
      roles.push(board.me.role);
    }
    expect(roles).toEqual(['head-brewer', 'brewer', 'taster']);
  });

  it('has exactly one link on Mind and one on Hold, and every stage', async () => {
    const board = await boardOf(await signedIn('mo@saltmarsh.example'), 'saltmarsh-brewers');
    const { totals, conflicts } = judgeBoard(contract.parse(board));
    expect(totals).toMatchObject({ pour: 3, mind: 1, hold: 1, unchecked: 0, chains: 3 });
    expect(conflicts).toEqual([]);
    const stages = new Set(board.batches.map(({ stage }) => stage));
    expect(stages).toEqual(new Set(['racked', 'fermenting', 'pencilled']));
  });

  it('has a season before it in the archive, brewed to its end, with no link on Hold', async () => {
    const mo = await signedIn('mo@saltmarsh.example');
    const seasons = await good<ListedSeason[]>(mo.get(api.seasons('saltmarsh-brewers')));
    expect(seasons).toMatchObject([
      { name: 'Spring season', isCurrent: true, batches: 12 },
      { name: 'Winter season', isArchived: true, chains: 2, batches: 5 },
    ]);
    const past = await boardOf(mo, placeOf('saltmarsh-brewers', seasons[1]?.id));
    expect(new Set(past.batches.map(({ stage }) => stage))).toEqual(new Set(['racked']));
    expect(judgeBoard(contract.parse(past))).toMatchObject({ conflicts: [], totals: { hold: 0 } });
  });

  it('has people who talk about its chains, and of a link about what it says', async () => {
    const mo = await signedIn('mo@saltmarsh.example');
    const { chains } = await boardOf(mo, 'saltmarsh-brewers');
    const talks = await Promise.all(
      chains.map(({ id }) => good<Talk>(mo.get(api.comments('saltmarsh-brewers', id)))),
    );
    expect(talks.map(({ comments }) => comments.length)).toEqual([4, 1, 1]);
    const said = talks[0]?.comments.filter(({ about }) => about.kind === 'link');
    expect(said).toMatchObject([
      { by: { name: 'Mo' }, said: { verdict: 'hold' } },
      { by: { name: 'Tamsin' }, said: { verdict: 'hold' } },
    ]);
  });

  it('is made once', async () => {
    await seedDemo(server.db, clock);
    const rows = await server.pool.query("select 1 from brewery where slug like 'saltmarsh-brew%'");
    expect(rows.rows).toHaveLength(1);
  });

  it('begins on the first of the five Saturdays up to today', () => {
    expect(firstBrewDay('2027-04-03')).toBe('2027-03-06');
    expect(firstBrewDay('2027-04-09')).toBe('2027-03-06');
    expect(firstBrewDay('2027-04-10')).toBe('2027-03-13');
  });

  it('tells the day where the brewery is', () => {
    expect(dayIn('Europe/London', new Date('2027-03-28T23:30:00Z'))).toBe('2027-03-29');
    expect(dayIn('America/New_York', new Date('2027-03-28T23:30:00Z'))).toBe('2027-03-28');
  });
});
