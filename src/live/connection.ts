import type { Ended } from '#shared/api/live.ts';
import type { LiveEvent } from './readEvents.ts';

/** `connecting`: never yet; `ended`: for good, since who asks may not look any more. */
export type LiveState = 'connecting' | 'live' | 'reconnecting' | 'ended';

/** What the one stream of a browser tells its tabs. */
export type Told =
  | { kind: 'state'; state: LiveState }
  | { kind: 'revision'; revision: number }
  | { kind: 'elsewhere' }
  | { kind: 'here'; people: string[] }
  | { kind: 'ended'; why: Ended }
  /** Nothing new, and all is well. */
  | { kind: 'beat'; beatMs: number };

/** Asking again is of no use. */
export class Refused extends Error {
  constructor(readonly why: Ended) {
    super(why);
  }
}

export interface Hearing {
  event(event: LiveEvent): void;
  /** Anything at all arrived. */
  beat(): void;
}

export interface ConnectionPorts {
  /** Opens a stream; resolves when the server ends it, rejects when it fails or cannot be had. */
  open(since: number | null, hearing: Hearing, signal: AbortSignal): Promise<void>;
  tell(told: Told): void;
  /** Calls once after so long; the answer calls it off. */
  after(ms: number, run: () => void): () => void;
  /** The network is back, or the page is looked at again; the answer ends the watching. */
  onWake(run: () => void): () => void;
  now(): number;
  random(): number;
}

const OPENING_MS = 10_000;
/** A loss that is over before is not worth a word. */
const UNSAID_MS = 1_500;
const FIRST_WAIT_MS = 500;
const LONGEST_WAIT_MS = 15_000;
/** A stream that lasted so long was a good one: the next loss starts from the shortest wait. */
const GOOD_MS = 5_000;
const SILENT_BEATS = 2.5;

/**
 * Keeps a stream open through sleep, lost networks and restarted servers. Waits are doubled and
 * spread out, so that a restarted server is not met by everybody at once; a wake-up ends a wait.
 */
export function keepConnected(ports: ConnectionPorts): { stop(): void } {
  let state: LiveState = 'connecting';
  let since: number | null = null;
  let beatMs = 15_000;
  let failures = 0;
  let heardAt = 0;
  let isStopped = false;
  let isWaiting = false;
  let attempt = new AbortController();
  let cancelWatch = () => {};
  let cancelWait = () => {};
  let cancelWord: (() => void) | null = null;

  const show = (next: LiveState) => {
    cancelWord?.();
    cancelWord = null;
    if (next === state) return;
    state = next;
    ports.tell({ kind: 'state', state });
  };
  const watchFor = (ms: number, controller: AbortController) => {
    cancelWatch();
    cancelWatch = ports.after(ms, () => controller.abort());
  };
  const take = (event: LiveEvent) => {
    switch (event.name) {
      case 'hello':
        ({ beatMs } = event.data);
        watchFor(beatMs * SILENT_BEATS, attempt);
        show('live');
        return ports.tell({ kind: 'beat', beatMs });
      case 'revision':
        since = event.data.revision;
        return ports.tell({ kind: 'revision', revision: since });
      case 'here':
        return ports.tell({ kind: 'here', people: event.data.people });
      case 'elsewhere':
        return ports.tell({ kind: 'elsewhere' });
      case 'ended':
        return end(event.data.why);
    }
  };
  const end = (why: Ended) => {
    if (isStopped) return;
    stop();
    show('ended');
    ports.tell({ kind: 'ended', why });
  };
  const connect = async () => {
    isWaiting = false;
    const controller = new AbortController();
    attempt = controller;
    const startedAt = ports.now();
    watchFor(OPENING_MS, controller);
    const hearing: Hearing = {
      event: (event) => attempt === controller && !isStopped && take(event),
      beat() {
        heardAt = ports.now();
        if (controller.signal.aborted || isStopped) return;
        watchFor(beatMs * SILENT_BEATS, controller);
        if (state === 'live') ports.tell({ kind: 'beat', beatMs });
      },
    };
    let refused: Ended | null = null;
    try {
      await ports.open(since, hearing, controller.signal);
    } catch (error) {
      if (error instanceof Refused) refused = error.why;
    }
    cancelWatch();
    if (isStopped || attempt !== controller) return;
    if (refused) return end(refused);
    failures = ports.now() - startedAt >= GOOD_MS ? 0 : failures + 1;
    wait();
  };
  const wait = () => {
    cancelWord ??= ports.after(UNSAID_MS, () => show('reconnecting'));
    isWaiting = true;
    const most = Math.min(LONGEST_WAIT_MS, FIRST_WAIT_MS * 2 ** failures);
    cancelWait = ports.after(most * (0.5 + ports.random() / 2), () => void connect());
  };
  const wake = () => {
    if (isStopped) return;
    if (isWaiting) {
      cancelWait();
      failures = 0;
      void connect();
    } else if (state === 'live' && ports.now() - heardAt > beatMs * 1.5) attempt.abort();
  };
  const stopWaking = ports.onWake(wake);
  const stop = () => {
    isStopped = true;
    stopWaking();
    for (const cancel of [cancelWatch, cancelWait, cancelWord]) cancel?.();
    attempt.abort();
  };
  void connect();
  return { stop };
}
