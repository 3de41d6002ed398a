import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import type { Told } from '../../../src/live/connection.ts';
import { createEventReader, type LiveEvent } from '../../../src/live/readEvents.ts';
import { shareStream } from '../../../src/live/shareStream.ts';

const NAME = 'barmkin live test';
const closing: (() => void)[] = [];
beforeEach(() => void vi.useFakeTimers());
afterEach(async () => {
  for (const close of closing.splice(0)) close();
  await vi.advanceTimersByTimeAsync(0);
  vi.useRealTimers();
});

/** The browser's locks, as far as they are used: one holder, a queue, and stealing. */
function fakeLocks() {
  interface Request {
    work: () => Promise<void>;
    resolve(): void;
    reject(error: Error): void;
  }
  let holder: Request | null = null;
  let queue: Request[] = [];
  const give = (request: Request) => {
    holder = request;
    void request.work().then(() => {
      if (holder !== request) return;
      holder = null;
      request.resolve();
      const next = queue.shift();
      if (next) give(next);
    });
  };
  const request = (_name: string, options: LockOptions, work: () => Promise<void>) =>
    new Promise<void>((resolve, reject) => {
      const made = { work, resolve, reject };
      options.signal?.addEventListener('abort', () => {
        if (!queue.includes(made)) return;
        queue = queue.filter((other) => other !== made);
        reject(new Error('called off'));
      });
      if (options.steal) {
        const robbed = holder;
        give(made);
        robbed?.reject(new Error('stolen'));
      } else if (holder) queue.push(made);
      else give(made);
    });
  return { request } as Pick<LockManager, 'request'>;
}

interface Bus {
  onmessage: ((event: MessageEvent) => void) | null;
  postMessage(data: unknown): void;
  close(): void;
}

function fakeChannels() {
  const open = new Set<Bus>();
  return () => {
    const mine: Bus = {
      onmessage: null,
      postMessage(data: unknown) {
        for (const other of open) if (other !== mine) other.onmessage?.({ data } as MessageEvent);
      },
      close: () => void open.delete(mine),
    };
    open.add(mine);
    return mine;
  };
}

interface Tab {
  heard: Told[];
  /** Says something on the stream of this tab, if it has one. */
  say: ((told: Told) => void) | null;
  close(): void;
}

function openTab(
  locks: Pick<LockManager, 'request'> | null,
  channel: Bus | null,
  isVisible = true,
): Tab {
  const tab: Tab = { heard: [], say: null, close: () => {} };
  tab.close = shareStream(NAME, {
    locks,
    channel,
    lead(tell) {
      tab.say = tell;
      return () => {
        tab.say = null;
      };
    },
    hear: (told) => tab.heard.push(told),
    after(ms, run) {
      const timer = setTimeout(run, ms);
      return () => clearTimeout(timer);
    },
    isVisible: () => isVisible,
  });
  closing.push(tab.close);
  return tab;
}

const soon = () => vi.advanceTimersByTimeAsync(0);
const revision = (number: number): Told => ({ kind: 'revision', revision: number });
const beat: Told = { kind: 'beat', beatMs: 1_000 };

it('gives one tab the stream, and every tab what it says', async () => {
  const [locks, channel] = [fakeLocks(), fakeChannels()];
  const tabs = [1, 2, 3].map(() => openTab(locks, channel()));
  await soon();
  expect(tabs.map(({ say }) => say !== null)).toEqual([true, false, false]);
  tabs[0]?.say?.(revision(4));
  for (const { heard } of tabs) expect(heard).toContainEqual(revision(4));
});

it('tells a tab that opens later how things stand', async () => {
  const [locks, channel] = [fakeLocks(), fakeChannels()];
  const first = openTab(locks, channel());
  await soon();
  first.say?.(revision(3));
  first.say?.(revision(4));
  const later = openTab(locks, channel());
  expect(later.heard).toEqual([{ kind: 'state', state: 'connecting' }, revision(4)]);
});

it('passes the stream on when the tab that has it is closed', async () => {
  const [locks, channel] = [fakeLocks(), fakeChannels()];
  const first = openTab(locks, channel());
  const second = openTab(locks, channel());
  await soon();
  first.close();
  await soon();
  expect([first.say, second.say !== null]).toEqual([null, true]);
});

it('relieves a tab that fell silent, where somebody is looking', async () => {
  const [locks, channel] = [fakeLocks(), fakeChannels()];
  const asleep = openTab(locks, channel());
  const hidden = openTab(locks, channel(), false);
  const seen = openTab(locks, channel());
  await soon();
  asleep.say?.(beat);
  await vi.advanceTimersByTimeAsync(2_900);
  expect(seen.say).toBeNull();
  await vi.advanceTimersByTimeAsync(200);
  expect([asleep.say, hidden.say, seen.say !== null]).toEqual([null, null, true]);
});

it.each(['locks', 'channel'] as const)('works alone without %s', async (missing) => {
  const channel = fakeChannels();
  const make = () => (missing === 'locks' ? openTab(null, channel()) : openTab(fakeLocks(), null));
  const [one, two] = [make(), make()];
  await soon();
  expect([one.say, two.say]).not.toContain(null);
  one.say?.(revision(1));
  expect([one.heard, two.heard]).toEqual([[revision(1)], []]);
});

it('reads events wherever the parts end, and passes over what it does not know', () => {
  const heard: LiveEvent[] = [];
  let beats = 0;
  const read = createEventReader(
    (event) => heard.push(event),
    () => (beats += 1),
  );
  const text =
    'event: hello\ndata: {"beatMs":15000}\n\n:\n\nevent: weather\ndata: {}\n\n' +
    'event: revision\nid: 5\ndata: {"revision":5}\n\nevent: revision\ndata: {"revision":"x"}\n\n';
  for (const letter of text) read(letter);
  expect(heard).toEqual([
    { name: 'hello', data: { beatMs: 15_000 } },
    { name: 'revision', data: { revision: 5 } },
  ]);
  expect(beats).toBe(5);
});
