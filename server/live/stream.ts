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

/** One open answer. */
export interface Stream extends Watcher {
  /** When it began, milliseconds of the process's own clock. */
  since: number;
  /** The newest revision that it was told of. */
  revision: number;
  /** Everybody here, as it was told last. */
  here: string;
  send<K extends LiveEventName>(name: K, data: LiveEvents[K]): void;
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
  const waiting = new Map<LiveEventName, string>();
  const write = (text: string) => {
    isFull = !res.write(text);
  };
  res.on('drain', () => {
    isFull = false;
    deaf = 0;
    if (waiting.size === 0) return;
    const text = [...waiting.values()].join('');
    waiting.clear();
    write(text);
  });
  return {
    ...watcher,
    since: performance.now(),
    revision: -1,
    here: '',
    send(name, data) {
      const text = eventText(name, data);
      if (isFull) waiting.set(name, text);
      else write(text);
    },
    beat() {
      if (!isFull) return write(':\n\n');
      deaf += 1;
      if (deaf >= DEAF_BEATS) res.destroy();
    },
    end(why) {
      if (why) write(eventText('ended', { why }));
      res.end();
    },
  };
}

function eventText<K extends LiveEventName>(name: K, data: LiveEvents[K]): string {
  const id = 'revision' in data ? `id: ${data.revision}\n` : '';
  return `event: ${name}\n${id}data: ${JSON.stringify(data)}\n\n`;
}
