import type { Response } from 'express';
import type { Ended, LiveEventName, LiveEvents } from '#shared/api/live.ts';

/** Who looks at what. */
export interface Watcher {
  streamId: string;
  personId: string;
  /** Hash of the sign-in that it hangs on. */
  tokenHash: string;
  breweryId: string;
  seasonId: string;
}

/** An event as it is sent: written once, however many streams it goes to. */
export interface WrittenEvent {
  name: LiveEventName;
  bytes: Buffer;
}

export function writeEvent<K extends LiveEventName>(name: K, data: LiveEvents[K]): WrittenEvent {
  const id = 'revision' in data ? `id: ${data.revision}\n` : '';
  const text = `event: ${name}\n${id}data: ${JSON.stringify(data)}\n\n`;
  return { name, bytes: Buffer.from(text) };
}

const BEAT = Buffer.from(':\n\n');

/** One open answer. */
export interface Stream extends Watcher {
  /** When it began, milliseconds of the process's own clock. */
  since: number;
  /** The newest revision that it was told of. */
  revision: number;
  /** Everybody here, as it was told last. */
  here: string;
  send(event: WrittenEvent): void;
  beat(): void;
  /** Ends it; with a reason the client does not come back. */
  end(why?: Ended): void;
}

/** A client that takes nothing for so many heartbeats is gone. */
const DEAF_BEATS = 2;

/**
 * Writes events, and never lets them pile up: while the client does not read, of each kind only the
 * newest is kept.
 */
export function openStream(res: Response, watcher: Watcher): Stream {
  res.status(200).set({
    'Content-Type': 'text/event-stream; charset=utf-8',
    // Compressed, an event would wait for the next one; proxies are asked not to hold it either.
    'Cache-Control': 'no-cache, no-transform',
    'X-Accel-Buffering': 'no',
  });
  res.flushHeaders();
  let isFull = false;
  let deaf = 0;
  const waiting = new Map<LiveEventName, Buffer>();
  const write = (bytes: Buffer) => {
    isFull = !res.write(bytes);
  };
  res.on('drain', () => {
    isFull = false;
    deaf = 0;
    if (waiting.size === 0) return;
    const bytes = Buffer.concat([...waiting.values()]);
    waiting.clear();
    write(bytes);
  });
  return {
    ...watcher,
    since: performance.now(),
    revision: -1,
    here: '',
    send({ name, bytes }) {
      if (isFull) waiting.set(name, bytes);
      else write(bytes);
    },
    beat() {
      if (!isFull) return write(BEAT);
      deaf += 1;
      if (deaf >= DEAF_BEATS) res.destroy();
    },
    end(why) {
      if (why) write(writeEvent('ended', { why }).bytes);
      res.end();
    },
  };
}
