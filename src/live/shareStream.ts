import type { LiveState, Told } from './connection.ts';

/** Tabs of one browser share a stream: the one that holds a lock has it and tells the others. */

/** What a tab needs of the browser; without locks or a channel each tab has its own stream. */
export interface SharePorts {
  locks: Pick<LockManager, 'request'> | null;
  channel: Pick<BroadcastChannel, 'postMessage' | 'close' | 'onmessage'> | null;
  /** Opens the stream; the answer closes it. */
  lead(tell: (told: Told) => void): () => void;
  hear(told: Told): void;
  after(ms: number, run: () => void): () => void;
  isVisible(): boolean;
}

type Message = { kind: 'asked' } | { kind: 'told'; told: Told };

/** A leader that the browser put to sleep says nothing for so many heartbeats: it is relieved. */
const SILENT_BEATS = 3;
const FIRST_PATIENCE_MS = 20_000;

export function shareStream(name: string, ports: SharePorts): () => void {
  const { locks, channel } = ports;
  if (!locks || !channel) return ports.lead(ports.hear);
  const leader = createLeader(channel, ports);
  const stopping = new AbortController();
  let cancelWatch = () => {};

  const queueUp = async (steal: boolean) => {
    const options: LockOptions = steal ? { steal } : { signal: stopping.signal };
    try {
      await locks.request(name, options, () => {
        cancelWatch();
        return leader.lead(stopping.signal);
      });
    } catch {
      // Called off, or another tab took the lock.
    }
    leader.rest();
    if (stopping.signal.aborted) return;
    watchFor(FIRST_PATIENCE_MS);
    void queueUp(false);
  };
  const watchFor = (ms: number) => {
    cancelWatch();
    cancelWatch = ports.after(ms, () => {
      if (leader.isLeading()) return;
      if (ports.isVisible()) void queueUp(true);
      else watchFor(ms);
    });
  };

  channel.onmessage = ({ data }: MessageEvent<Message>) => {
    if (data.kind === 'asked') return leader.repeat();
    if (leader.isLeading()) return;
    watchFor(data.told.kind === 'beat' ? data.told.beatMs * SILENT_BEATS : FIRST_PATIENCE_MS);
    ports.hear(data.told);
  };
  watchFor(FIRST_PATIENCE_MS);
  void queueUp(false);
  channel.postMessage({ kind: 'asked' } satisfies Message);
  return () => {
    stopping.abort();
    cancelWatch();
    leader.rest();
    channel.close();
  };
}

function createLeader(channel: NonNullable<SharePorts['channel']>, ports: SharePorts) {
  let stop: (() => void) | null = null;
  let last = new Map<Told['kind'], Told>();
  const post = (told: Told) => channel.postMessage({ kind: 'told', told } satisfies Message);
  const tell = (told: Told) => {
    last.set(told.kind, told);
    ports.hear(told);
    post(told);
  };
  const start: LiveState = 'connecting';
  return {
    /** Until the signal; the lock is held for as long. */
    lead(signal: AbortSignal): Promise<void> {
      if (signal.aborted) return Promise.resolve();
      last = new Map([['state', { kind: 'state', state: start }]]);
      stop = ports.lead(tell);
      return new Promise((resolve) => signal.addEventListener('abort', () => resolve()));
    },
    rest() {
      stop?.();
      stop = null;
    },
    isLeading: () => stop !== null,
    /** A tab that opens asks how things stand. */
    repeat() {
      if (stop !== null) for (const told of last.values()) post(told);
    },
  };
}
