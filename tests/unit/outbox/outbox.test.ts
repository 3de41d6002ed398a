import { describe, expect, it } from 'vitest';
import { createOutbox } from '../../../src/outbox/createOutbox.ts';
import type { Entry, Outcome } from '../../../src/outbox/entry.ts';
import type { Entries } from '../../../src/outbox/queue.ts';

const entry = (id: string, more: Partial<Entry> = {}): Entry => ({
  id,
  personId: 'orla',
  contract: 1,
  madeAt: '2027-03-20T14:05:00.000Z',
  method: 'POST',
  url: '/api/rows',
  body: { id },
  what: id,
  page: '/b/reedbed',
  touches: [['rows', id]],
  refusal: null,
  ...more,
});
const REFUSED: Outcome = {
  kind: 'refused',
  refusal: { status: 422, kind: 'invalid-request', sentence: 'No.', errors: [] },
};

/** Tabs of one browser: one storage, one lock, one who is signed in. */
function browser(answers: (entry: Entry) => Outcome) {
  let stored: Entries = [];
  let last: Promise<void> = Promise.resolve();
  let held: Promise<void> = Promise.resolve();
  const sent: string[] = [];
  const taken: string[] = [];
  const state = { person: 'orla' as string | null, hope: true, weary: false };
  const tab = () =>
    createOutbox({
      storage: {
        read: async () => stored,
        change: async (how) => (stored = how(stored)),
      },
      send: async (one) => {
        sent.push(one.id);
        await held;
        return answers(one);
      },
      person: () => state.person,
      alone: (work) => (last = last.then(work, work)),
      taken: ({ id }) => taken.push(id),
      isHopeful: () => state.hope,
      patience: () => (state.weary ? Promise.resolve() : new Promise<void>(() => {})),
      tell: () => {},
    });
  /** No answer comes until the returned function is called. */
  const hold = () => {
    let release = () => {};
    held = new Promise((resolve) => (release = resolve));
    return () => release();
  };
  return { tab, sent, taken, state, hold, stored: () => stored };
}

const done: Outcome = { kind: 'done', answer: { version: 1 } };

describe('the outbox of a device', () => {
  it('sends at once where it can, and says what the server answered', async () => {
    const { tab, taken } = browser(() => done);
    expect(await tab().add(entry('a'))).toEqual({ kind: 'sent', answer: { version: 1 } });
    expect(taken).toEqual(['a']);
  });

  it('keeps what it cannot send, behind what waits already', async () => {
    let online = false;
    const { tab, sent, stored } = browser(() => (online ? done : { kind: 'lost' }));
    const one = tab();
    expect(await one.add(entry('a'))).toEqual({ kind: 'waiting' });
    expect(await one.add(entry('b'))).toEqual({ kind: 'waiting' });
    expect(one.get().map(({ id }) => id)).toEqual(['a', 'b']);
    online = true;
    sent.length = 0;
    await one.flush();
    expect(sent).toEqual(['a', 'b']);
    expect(stored()).toEqual([]);
  });

  it('is written by one tab and sent by another, once', async () => {
    let online = false;
    const { tab, sent } = browser(() => (online ? done : { kind: 'lost' }));
    const [left, right] = [tab(), tab()];
    await left.add(entry('a'));
    online = true;
    sent.length = 0;
    await Promise.all([left.flush(), right.flush()]);
    expect(sent).toEqual(['a']);
  });

  it('tells a tab what another one sent for it', async () => {
    const { tab, sent, taken, hold } = browser(() => done);
    const release = hold();
    const first = tab().add(entry('a'));
    await expect.poll(() => sent).toEqual(['a']);
    const second = tab().add(entry('b'));
    release();
    expect(await first).toEqual({ kind: 'sent', answer: { version: 1 } });
    // The first tab had not done yet, and sent this too: the second has no answer of its own.
    expect(await second).toEqual({ kind: 'sent', answer: undefined });
    expect(sent).toEqual(['a', 'b']);
    expect(taken).toEqual(['a', 'b', 'b']);
  });

  it('stops at a refusal until somebody chose, and loses nothing behind it', async () => {
    const { tab, sent } = browser(({ id }) => (id === 'a' ? REFUSED : done));
    const one = tab();
    expect(await one.add(entry('a'))).toMatchObject({ kind: 'refused' });
    expect(await one.add(entry('b'))).toEqual({ kind: 'waiting' });
    expect(sent).toEqual(['a']);
    await one.discard('a');
    expect(sent).toEqual(['a', 'b']);
    expect(one.get()).toEqual([]);
  });

  it('tries a refused one again when told', async () => {
    let refuses = true;
    const { tab, sent } = browser(() => (refuses ? REFUSED : done));
    const one = tab();
    await one.add(entry('a'));
    refuses = false;
    await one.retry('a', 'as-it-was');
    expect(sent).toEqual(['a', 'a']);
    expect(one.get()).toEqual([]);
  });

  it('asks nobody where there is no connection, and keeps nobody waiting where it is weak', async () => {
    const { tab, sent, state, stored } = browser(() => done);
    const one = tab();
    state.hope = false;
    expect(await one.add(entry('a'))).toEqual({ kind: 'waiting' });
    expect(sent).toEqual([]);
    Object.assign(state, { hope: true, weary: true });
    expect(await one.add(entry('b'))).toEqual({ kind: 'waiting' });
    await one.flush();
    expect(sent).toEqual(['a', 'b']);
    expect(stored()).toEqual([]);
  });

  it('shows and sends nothing of somebody else', async () => {
    const { tab, sent, state, stored } = browser(() => ({ kind: 'lost' }));
    const one = tab();
    await one.add(entry('a'));
    state.person = 'ned';
    sent.length = 0;
    await one.flush();
    expect(one.get()).toEqual([]);
    expect(sent).toEqual([]);
    expect(stored()).toHaveLength(1);
    state.person = null;
    await one.flush();
    expect(sent).toEqual([]);
  });

  it('gives the same list while nothing changes, as a page that draws it needs', async () => {
    const { tab } = browser(() => ({ kind: 'lost' }));
    const one = tab();
    await one.add(entry('a'));
    expect(one.get()).toBe(one.get());
  });
});
