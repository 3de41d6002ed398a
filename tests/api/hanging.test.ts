import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import type { Moved } from '#shared/api/move.ts';
import { api } from '#shared/api/urls.ts';
import { aBatch, aChain } from '../support/bodies.ts';
import { testClock } from '../support/clock.ts';
import { guestOn, invited } from '../support/guests.ts';
import { hand, opened, racked } from '../support/pours.ts';
import {
  batchOf,
  boardOf,
  good,
  shelve,
  testSeason,
  wish,
  type TestSeason,
} from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

const DAY_MS = 24 * 60 * 60 * 1000;
const clock = testClock('2027-04-03T13:00:00Z');
let server: TestServer;
let season: TestSeason;
let head: Visitor;
let slug = '';
/** On shelf B, with nothing else. */
let mole = '';

beforeAll(async () => {
  server = await startTestServer({ clock });
});
afterAll(() => server.close());
beforeEach(async () => {
  season = await testSeason(server.url);
  ({ head, slug } = season);
  [mole = ''] = await shelve(season, season.chainB, [{ name: 'Mole' }]);
});

const removeBatch = async (id = mole) =>
  head.ask('DELETE', api.batch(slug, id), { version: (await batchOf(head, slug, id)).version });
const removeShelf = async (id = season.chainB) => {
  const { chains } = await boardOf(head, slug);
  const version = chains.find((each) => each.id === id)?.version ?? 0;
  return head.ask('DELETE', api.chain(slug, id), { version });
};
const undo = async () =>
  head.post(api.undo(slug), { changeId: (await boardOf(head, slug)).undo?.id });

const refused = (detail: string, type = '/problems/in-use') => ({
  status: 409,
  body: { type, detail: `${detail}, which would go with it` },
});

const note = (batchId = mole) =>
  good<{ id: string }>(head.post(api.notes(slug, batchId), { id: randomUUID(), text: 'Dry' }));
const plan = () =>
  good(
    head.post(api.events(slug, mole), {
      id: randomUUID(),
      kind: 'dry-hop',
      plannedOn: '2027-04-18',
      doneAt: null,
      text: '46 g',
    }),
  );
const say = (about: object, chainId = season.chainB) =>
  good<{ id: string; version: number }>(
    head.post(api.comments(slug, chainId), { id: randomUUID(), about, text: 'Too strong?' }),
  );
const share = (chainId = season.chainB, expiresOn = '2027-04-30') =>
  good<{ id: string }>(
    head.post(api.shareLinks(slug, chainId), {
      id: randomUUID(),
      name: 'For the festival',
      expiresOn,
      showPrices: false,
    }),
  );

describe('a batch is deleted', () => {
  it('where nothing was written of it', async () => {
    expect((await removeBatch()).status).toBe(204);
  });

  it('not with what was written and said of it; each of it can be taken away first', async () => {
    const { id } = await note();
    await plan();
    await plan();
    const comment = await say({ kind: 'batch', batchId: mole });
    const refusal = await removeBatch();
    expect(refusal).toMatchObject(refused('Mole has 1 note, 2 events and 1 comment'));
    await good(head.ask('DELETE', api.note(slug, mole, id), { version: 1 }));
    const { version } = comment;
    await good(head.ask('DELETE', api.comment(slug, season.chainB, comment.id), { version }));
    expect(await removeBatch()).toMatchObject(refused('Mole has 2 events'));
  });

  it('not with a pour that was begun and left; one that was only opened is nothing', async () => {
    const pour = await opened(head, { ...(await racked(season, clock)), batchId: mole });
    await good(hand(head, pour, clock).leave());
    const again = await opened(head, pour);
    await good(hand(head, again, clock).read(24));
    await good(hand(head, again, clock).leave());
    expect(await removeBatch()).toMatchObject(refused('Mole has 1 begun pour'));
  });

  it('by an undo neither', async () => {
    const body = aBatch({ name: 'Spit' });
    await good(head.post(api.batches(slug), body));
    await note(body.id);
    const refusal = await undo();
    expect(refusal).toMatchObject(refused('Spit has 1 note', '/problems/not-undoable'));
    expect((await batchOf(head, slug, body.id)).name).toBe('Spit');
  });
});

describe('a shelf is taken down', () => {
  it('where nothing was said of it, and nobody else sees it', async () => {
    expect((await removeShelf()).status).toBe(204);
  });

  it('not with its talk, links, guests and invitations', async () => {
    await say({ kind: 'chain' });
    await say({ kind: 'batch', batchId: mole });
    const link = await share();
    const { guestId } = await guestOn(season, season.chainB);
    const invitation = await invited(season, season.chainB);
    expect(await removeShelf()).toMatchObject(
      refused('Shelf B has 2 comments, 1 link, 1 guest and 1 open invitation'),
    );
    for (const path of [
      api.shareLink(slug, link.id),
      api.guest(slug, guestId),
      api.guest(slug, invitation.id),
    ])
      await good(head.ask('DELETE', path));
    expect(await removeShelf()).toMatchObject(refused('Shelf B has 2 comments'));
  });

  it('with a link or an invitation that has run out', async () => {
    await share(season.chainB, '2027-04-05');
    await invited(season, season.chainB);
    clock.advance(8 * DAY_MS);
    const removed = await removeShelf();
    clock.advance(-8 * DAY_MS);
    expect(removed.status).toBe(204);
  });

  it('by an undo neither, of its making or of the move that put it up', async () => {
    const made = aChain(season.yeastId, { name: 'Shelf C' });
    await good(head.post(api.chains(slug), made));
    await say({ kind: 'chain' }, made.id);
    const type = '/problems/not-undoable';
    expect(await undo()).toMatchObject(refused('Shelf C has 1 comment', type));
    const newChain = aChain(season.yeastId, { name: 'Shelf D' });
    const up = wish({ batchId: mole, toChainId: 'new', expectedChainId: season.chainB, newChain });
    await good<Moved>(head.post(api.moves(slug), up));
    await share(newChain.id);
    expect(await undo()).toMatchObject(refused('Shelf D has 1 link', type));
    expect((await batchOf(head, slug, mole)).chainId).toBe(newChain.id);
  });
});
