import { describe, expect, it } from 'vitest';
import { keepConnected, Refused, type Hearing, type Told } from '../../../src/live/connection.ts';

interface Opened {
  since: number | null;
  hearing: Hearing;
  signal: AbortSignal;
  end(): void;
  fail(error?: Error): void;
}

/** A connection whose server, clock and network are moved by hand. */
function byHand() {
  const opened: Opened[] = [];
  const told: Told[] = [];
  let timers: { at: number; run: () => void }[] = [];
  let now = 0;
  let wake = () => {};
  const connection = keepConnected({
    open: (since, hearing, signal) =>
      new Promise((resolve, reject) => {
        const fail = (error = new Error('lost')) => reject(error);
        opened.push({ since, hearing, signal, end: resolve, fail });
        signal.addEventListener('abort', () => fail());
      }),
    tell: (one) => told.push(one),
    after(ms, run) {
      const timer = { at: now + ms, run };
      timers.push(timer);
      return () => {
        timers = timers.filter((other) => other !== timer);
      };
    },
    onWake(run) {
      wake = run;
      return () => {
        wake = () => {};
      };
    },
    now: () => now,
    random: () => 1,
  });
  const settle = async () => {
    for (let turn = 0; turn < 5; turn += 1) await Promise.resolve();
  };
  return {
    told,
    opened,
    stop: connection.stop,
    last: () => opened.at(-1) ?? expect.unreachable('nothing was opened'),
    states: () => told.flatMap((one) => (one.kind === 'state' ? [one.state] : [])),
    wake: async () => {
      wake();
      await settle();
    },
    settle,
    async pass(ms: number) {
      await settle();
      const end = now + ms;
      for (;;) {
        const [next] = timers.filter(({ at }) => at <= end).toSorted((a, b) => a.at - b.at);
        if (!next) break;
        timers = timers.filter((timer) => timer !== next);
        now = next.at;
        next.run();
        await settle();
      }
      now = end;
      await settle();
    },
  };
}

const hello = ({ hearing }: Opened) => {
  hearing.beat();
  hearing.event({ name: 'hello', data: { beatMs: 1_000 } });
};

describe('a stream', () => {
  it('is live from its first event on, and passes on what it hears', () => {
    const hand = byHand();
    expect(hand.states()).toEqual([]);
    hello(hand.last());
    hand.last().hearing.event({ name: 'revision', data: { revision: 7 } });
    hand.last().hearing.event({ name: 'here', data: { people: ['a'] } });
    expect(hand.told).toEqual([
      { kind: 'state', state: 'live' },
      { kind: 'beat', beatMs: 1_000 },
      { kind: 'revision', revision: 7 },
      { kind: 'here', people: ['a'] },
    ]);
  });

  it('comes back after a loss, from the revision it heard last, before a word is said', async () => {
    const hand = byHand();
    hello(hand.last());
    hand.last().hearing.event({ name: 'revision', data: { revision: 7 } });
    hand.last().end();
    await hand.pass(1_000);
    expect(hand.opened.map(({ since }) => since)).toEqual([null, 7]);
    hello(hand.last());
    await hand.pass(900);
    expect(hand.states()).toEqual(['live']);
  });

  it('says so when the loss lasts, once, and when it is over', async () => {
    const hand = byHand();
    hello(hand.last());
    hand.last().end();
    for (let tries = 0; tries < 4; tries += 1) {
      await hand.pass(8_000);
      hand.last().fail();
    }
    await hand.pass(16_000);
    hello(hand.last());
    expect(hand.states()).toEqual(['live', 'reconnecting', 'live']);
  });

  it('waits longer from try to try, up to a bound', async () => {
    const hand = byHand();
    const gaps: number[] = [];
    for (let tries = 0; tries < 7; tries += 1) {
      const before = hand.opened.length;
      hand.last().fail();
      await hand.settle();
      let waited = 0;
      while (hand.opened.length === before) {
        await hand.pass(250);
        waited += 250;
      }
      gaps.push(waited);
    }
    expect(gaps).toEqual([1_000, 2_000, 4_000, 8_000, 15_000, 15_000, 15_000]);
  });

  it('begins with the shortest wait after one that was good for a while', async () => {
    const hand = byHand();
    hand.last().fail();
    await hand.pass(1_000);
    hello(hand.last());
    for (let beat = 0; beat < 10; beat += 1) {
      await hand.pass(600);
      hand.last().hearing.beat();
    }
    hand.last().end();
    await hand.pass(500);
    expect(hand.opened).toHaveLength(3);
  });

  it('gives up one that is silent for longer than its heartbeats allow', async () => {
    const hand = byHand();
    hello(hand.last());
    const first = hand.last();
    await hand.pass(2_400);
    expect(first.signal.aborted).toBe(false);
    await hand.pass(200);
    expect(first.signal.aborted).toBe(true);
    await hand.pass(2_000);
    expect(hand.opened).toHaveLength(2);
    first.hearing.event({ name: 'revision', data: { revision: 9 } });
    expect(hand.told).not.toContainEqual({ kind: 'revision', revision: 9 });
  });

  it('gives up a server that takes the request and says nothing', async () => {
    const hand = byHand();
    await hand.pass(10_000);
    expect(hand.last().signal.aborted).toBe(true);
    await hand.pass(1_000);
    expect(hand.opened).toHaveLength(2);
  });

  it('waits no longer when the network is back or the page is looked at', async () => {
    const hand = byHand();
    for (let tries = 0; tries < 5; tries += 1) {
      hand.last().fail();
      await hand.pass(15_000);
    }
    hand.last().fail();
    await hand.settle();
    const before = hand.opened.length;
    await hand.wake();
    expect(hand.opened).toHaveLength(before + 1);
    await hand.wake();
    expect(hand.opened).toHaveLength(before + 1);
  });

  it.each([
    [
      'signed-out',
      (one: Opened) => one.hearing.event({ name: 'ended', data: { why: 'signed-out' } }),
    ],
    ['not-a-member', (one: Opened) => one.fail(new Refused('not-a-member'))],
  ] as const)('does not come back after the end: %s', async (why, end) => {
    const hand = byHand();
    end(hand.last());
    await hand.pass(60_000);
    await hand.wake();
    expect(hand.told).toEqual([
      { kind: 'state', state: 'ended' },
      { kind: 'ended', why },
    ]);
    expect(hand.opened).toHaveLength(1);
  });

  it('is closed with the page', async () => {
    const hand = byHand();
    hand.stop();
    await hand.pass(60_000);
    expect([hand.last().signal.aborted, hand.opened.length, hand.told]).toEqual([true, 1, []]);
  });
});
