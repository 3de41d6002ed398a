import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  comment as contract,
  type Comment,
  type CommentAbout,
  type Talk,
} from '#shared/api/comment.ts';
import { api } from '#shared/api/urls.ts';
import { boardOf, good, joined, shelve, testSeason, type TestSeason } from '../support/season.ts';
import { startTestServer, type TestServer } from '../support/server.ts';
import type { Visitor } from '../support/visitor.ts';

let server: TestServer;
let season: TestSeason;
let brewer: Visitor;
let taster: Visitor;
let blonde: string;
let pale: string;

beforeAll(async () => {
  server = await startTestServer();
  season = await testSeason(server.url);
  [blonde = '', pale = ''] = await shelve(season, season.chainA, [
    { name: 'Blonde', og: 1.078, fg: 1.014 },
    { name: 'Pale', og: 1.04, srm: 7, ibu: 38 },
  ]);
  brewer = await joined(season, 'brewer');
  taster = await joined(season, 'taster');
});
afterAll(() => server.close());

const CHAIN: CommentAbout = { kind: 'chain' };
const say = (who: Visitor, text: string, about: CommentAbout = CHAIN, id: string = randomUUID()) =>
  who.post(api.comments(season.slug, season.chainA), { id, about, text });
const said = (...args: Parameters<typeof say>) => good<Comment>(say(...args));
const talkOf = (who: Visitor, chainId = season.chainA) =>
  good<Talk>(who.get(api.comments(season.slug, chainId)));
const at = (id: string) => api.comment(season.slug, season.chainA, id);
const remove = (who: Visitor, { id, version }: Comment) => who.ask('DELETE', at(id), { version });

describe('talk of a chain', () => {
  it('is open to every role, in the order it was said', async () => {
    const first = contract.parse(await said(taster, 'Clean, nothing buttery.'));
    const second = await said(brewer, 'Then Pale goes onto it.');
    const { comments } = await talkOf(season.head);
    expect(comments.map(({ id }) => id)).toEqual([first.id, second.id]);
    expect(comments[0]).toMatchObject({
      text: 'Clean, nothing buttery.',
      by: { name: 'The taster', initials: 'TT' },
      about: CHAIN,
      said: null,
      editedAt: null,
    });
  });

  it('keeps what a link said when it was spoken of, also after the link says something else', async () => {
    const about = { kind: 'link', batchId: pale } as const;
    const { id, said: then } = await said(brewer, 'We wait for the count.', about);
    expect(then).toEqual({ verdict: 'hold', findings: expect.any(Number), reason: 'Tired cake' });
    const board = await boardOf(season.head, season.slug);
    const { version = 0 } = board.batches.find((batch) => batch.id === blonde) ?? {};
    await good(
      season.head.patch(api.batch(season.slug, blonde), { og: 1.044, fg: 1.011 }, version),
    );
    const after = (await talkOf(taster)).comments.find((each) => each.id === id);
    expect([after?.said?.verdict, after?.about]).toEqual(['hold', about]);
  });

  it.each<[string, CommentAbout | { kind: string }, string]>([
    ['a batch of another shelf', { kind: 'batch', batchId: randomUUID() }, '/about/batchId'],
    ['a first batch as if it were a link', { kind: 'link', batchId: '' }, '/about/batchId'],
  ])('is not about %s', async (_, about, pointer) => {
    const named =
      'batchId' in about && about.batchId === '' ? { ...about, batchId: blonde } : about;
    const { status, body } = await say(brewer, 'About nothing', named as CommentAbout);
    expect([status, body]).toMatchObject([422, { errors: [{ pointer }] }]);
  });

  it('takes up to 2000 characters, and something', async () => {
    expect((await say(taster, 'x'.repeat(2000))).status).toBe(201);
    expect((await say(taster, 'x'.repeat(2001))).status).toBe(422);
    expect((await say(taster, '   ')).status).toBe(422);
  });

  it('says a thing once, however often it is sent', async () => {
    const id = randomUUID();
    const { seq } = await said(taster, 'Once', CHAIN, id);
    expect((await said(taster, 'Once', CHAIN, id)).seq).toBe(seq);
    expect((await say(taster, 'Twice', CHAIN, id)).status).toBe(409);
    const { comments } = await talkOf(taster);
    expect(comments.filter((each) => each.id === id)).toHaveLength(1);
  });
});

describe('a comment', () => {
  it('is changed by whoever wrote it, which shows', async () => {
    const { id, version } = await said(taster, 'Buttery');
    const changed = await good<Comment>(taster.patch(at(id), { text: 'Butter, faint' }, version));
    expect(changed).toMatchObject({ text: 'Butter, faint', version: version + 1 });
    expect(changed.editedAt).not.toBeNull();
    expect((await taster.patch(at(id), { text: 'Late' }, version)).status).toBe(412);
    expect((await season.head.patch(at(id), { text: 'Mine' }, version + 1)).status).toBe(403);
  });

  it('leaves its place when it is removed, and can be put back', async () => {
    const mine = await said(taster, 'Never mind');
    const gone = await good<Comment>(remove(taster, mine));
    expect(gone.text).toBeNull();
    expect((await taster.patch(at(mine.id), { text: 'Again' }, gone.version)).status).toBe(409);
    const inTalk = (await talkOf(brewer)).comments.find(({ id }) => id === mine.id);
    expect(inTalk?.text).toBeNull();
    const back = await good<Comment>(taster.patch(at(mine.id), { removed: false }, gone.version));
    expect(back.text).toBe('Never mind');
  });

  it('of another is removed by the head brewer alone', async () => {
    const theirs = await said(taster, 'Rude');
    expect((await remove(brewer, theirs)).status).toBe(403);
    const gone = await good<Comment>(remove(season.head, theirs));
    expect((await brewer.patch(at(theirs.id), { removed: false }, gone.version)).status).toBe(403);
    expect((await season.head.patch(at(theirs.id), { removed: false }, gone.version)).status).toBe(
      200,
    );
  });
});

describe('unread marks', () => {
  const unreadOf = async (who: Visitor) =>
    (await boardOf(who, season.slug)).unread[season.chainB] ?? 0;
  const sayB = (who: Visitor, text: string) =>
    good<Comment>(
      who.post(api.comments(season.slug, season.chainB), {
        id: randomUUID(),
        about: CHAIN,
        text,
      }),
    );
  const see = (who: Visitor, seq: number) =>
    good(who.post(api.commentsSeen(season.slug, season.chainB), { seq }));

  it('count what others said since one last looked', async () => {
    const revision = (await boardOf(brewer, season.slug)).season.revision;
    const first = await sayB(taster, 'One');
    const second = await sayB(taster, 'Two');
    expect([await unreadOf(taster), await unreadOf(brewer)]).toEqual([0, 2]);
    expect((await talkOf(brewer, season.chainB)).unread).toBe(2);
    // Whoever has the board open is told by the season's revision.
    expect((await boardOf(brewer, season.slug)).season.revision).toBe(revision + 2);
    await see(brewer, first.seq);
    expect(await unreadOf(brewer)).toBe(1);
    await see(brewer, second.seq);
    expect(await unreadOf(brewer)).toBe(0);
    // A tab that was left behind does not make it unread again.
    await see(brewer, first.seq);
    expect(await unreadOf(brewer)).toBe(0);
    expect((await talkOf(brewer, season.chainB)).seen).toBe(second.seq);
  });

  it('do not count what was removed', async () => {
    const before = await unreadOf(season.head);
    const third = await sayB(brewer, 'Three');
    expect(await unreadOf(season.head)).toBe(before + 1);
    const one = api.comment(season.slug, season.chainB, third.id);
    await good(brewer.ask('DELETE', one, { version: third.version }));
    expect(await unreadOf(season.head)).toBe(before);
  });
});

it('belongs to its brewery', async () => {
  const other = await testSeason(server.url);
  const { id, version } = await said(taster, 'Ours');
  const asked = [
    other.head.get(api.comments(other.slug, season.chainA)),
    other.head.post(api.comments(other.slug, season.chainA), {
      id: randomUUID(),
      about: CHAIN,
      text: 'Theirs',
    }),
    other.head.patch(api.comment(other.slug, season.chainA, id), { text: 'x' }, version),
    other.head.patch(api.comment(other.slug, other.chainA, id), { text: 'x' }, version),
    other.head.ask('DELETE', api.comment(other.slug, other.chainA, id), { version }),
    other.head.post(api.commentsSeen(other.slug, season.chainA), { seq: 1 }),
  ];
  for (const reply of await Promise.all(asked)) expect(reply.status).toBe(404);
  expect((await boardOf(other.head, other.slug)).unread).toEqual({});
});
