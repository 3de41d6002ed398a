import fc from 'fast-check';
import { expect, test } from 'vitest';
import type { Entry, Outcome } from '../../src/outbox/entry.ts';
import { withNew, type Entries } from '../../src/outbox/queue.ts';
import { sendAll } from '../../src/outbox/sendAll.ts';

/**
 * A server that, as ours, makes a row of one id once and takes a change only from the version that
 * is there. It writes down everything that it did.
 */
function server() {
  const rows = new Map<string, { version: number; text: string }>();
  const did: string[] = [];
  const conflict = (status: number, current: unknown): Outcome => ({
    kind: 'refused',
    refusal: { status, kind: null, sentence: 'no', errors: [], current },
  });
  const take = (entry: Entry): Outcome => {
    const text = String(Reflect.get(entry.body as object, 'text'));
    if (entry.method === 'POST') {
      if (!rows.has(entry.id)) {
        rows.set(entry.id, { version: 1, text });
        did.push(entry.what);
      }
      return { kind: 'done', answer: rows.get(entry.id) };
    }
    const id = entry.url.slice('/rows/'.length);
    const row = rows.get(id);
    if (!row) return conflict(404, undefined);
    if (row.version !== entry.ifMatch) return conflict(412, row);
    rows.set(id, { version: row.version + 1, text });
    did.push(entry.what);
    return { kind: 'done', answer: rows.get(id) };
  };
  return { take, did, rows };
}

class Killed extends Error {}

type Step =
  | { do: 'write'; change: number | null }
  | {
      do: 'send';
      fates: ('works' | 'lost-before' | 'lost-after' | 'killed-before' | 'killed-after')[];
    };

const step: fc.Arbitrary<Step> = fc.oneof(
  fc.record({
    do: fc.constant('write' as const),
    change: fc.option(fc.nat({ max: 20 }), { freq: 2 }),
  }),
  fc.record({
    do: fc.constant('send' as const),
    fates: fc.array(
      fc.constantFrom('works', 'lost-before', 'lost-after', 'killed-before', 'killed-after'),
      { maxLength: 6 },
    ),
  }),
);

/** An outbox on a device: its storage outlives whatever happens to the page. */
function device(take: (entry: Entry) => Outcome) {
  let stored: Entries = [];
  const storage = {
    read: async () => stored,
    change: async (how: (entries: Entries) => Entries) => (stored = how(stored)),
  };
  const made: string[] = [];
  const written: string[] = [];

  /** A new row, or a change of one that was made here before, as the page last knew it. */
  const write = (change: number | null) => {
    const at = written.length;
    const of = change === null ? undefined : made[change % Math.max(1, made.length)];
    const what = of === undefined ? `make ${at}` : `change ${of} ${at}`;
    const base = {
      personId: 'orla',
      contract: 1,
      madeAt: '',
      page: '',
      touches: [],
      refusal: null,
    };
    const entry: Entry =
      of === undefined
        ? { ...base, id: `row${at}`, method: 'POST', url: '/rows', body: { text: what }, what }
        : {
            ...base,
            id: `change${at}`,
            method: 'PATCH',
            url: `/rows/${of}`,
            body: { text: what },
            ifMatch: versionKnown(of),
            what,
          };
    if (of === undefined) made.push(entry.id);
    written.push(what);
    stored = withNew(stored, entry);
  };
  /** What the page shows: the version it was answered last, 1 for a row that still waits. */
  const known = new Map<string, number>();
  const versionKnown = (row: string) => {
    const waiting = stored.filter((entry) => entry.url === `/rows/${row}`).at(0);
    return waiting?.ifMatch ?? known.get(row) ?? 1;
  };

  const send = async (fates: Extract<Step, { do: 'send' }>['fates']) => {
    let turn = 0;
    const settled = (entry: Entry, outcome: Outcome) => {
      const row = entry.method === 'POST' ? entry.id : entry.url.slice('/rows/'.length);
      const answer =
        outcome.kind === 'done'
          ? outcome.answer
          : outcome.kind === 'refused'
            ? outcome.refusal.current
            : null;
      const version: unknown = answer ? Reflect.get(answer, 'version') : undefined;
      if (typeof version === 'number') known.set(row, version);
    };
    const through = async (entry: Entry): Promise<Outcome> => {
      const fate = fates[turn] ?? 'works';
      turn += 1;
      if (fate === 'killed-before') throw new Killed();
      if (fate === 'lost-before') return { kind: 'lost' };
      const outcome = take(entry);
      if (fate === 'killed-after') throw new Killed();
      return fate === 'lost-after' ? { kind: 'lost' } : outcome;
    };
    await sendAll('orla', { storage, send: through, settled }).catch((error: unknown) => {
      if (!(error instanceof Killed)) throw error;
    });
  };
  return { write, send, written, left: () => stored };
}

test('whatever is lost on the way and however often the page dies, each arrives once and in order', async () => {
  await fc.assert(
    fc.asyncProperty(fc.array(step, { minLength: 1, maxLength: 40 }), async (steps) => {
      const { take, did, rows } = server();
      const phone = device(take);
      for (const one of steps) {
        if (one.do === 'write') phone.write(one.change);
        else await phone.send(one.fates);
      }
      await phone.send([]);
      expect(phone.left(), 'nothing waits any more').toEqual([]);
      expect(did, 'each once, in the order of writing').toEqual(phone.written);
      for (const [id, row] of rows) {
        const last = phone.written.findLast(
          (what) => what.split(' ')[1] === id || `row${what.split(' ')[1]}` === id,
        );
        expect(row.text, 'the row as it was written last').toBe(last);
      }
    }),
    { numRuns: 1000 },
  );
});

test('nothing of another person is sent', async () => {
  const { take, did } = server();
  let stored: Entries = [];
  const entry: Entry = {
    id: 'row',
    personId: 'ned',
    contract: 1,
    madeAt: '',
    method: 'POST',
    url: '/rows',
    body: { text: 'x' },
    what: 'x',
    page: '',
    touches: [],
    refusal: null,
  };
  stored = [entry];
  const storage = {
    read: async () => stored,
    change: async (how: (entries: Entries) => Entries) => (stored = how(stored)),
  };
  await sendAll('orla', { storage, send: async (one) => take(one), settled: () => {} });
  expect(did).toEqual([]);
  expect(stored).toEqual([entry]);
});
