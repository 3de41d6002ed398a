import pg from 'pg';
import type { Log } from '../log.ts';
import { CHANNEL, readNote, type Note } from './note.ts';

const FIRST_WAIT_MS = 200;
const LONGEST_WAIT_MS = 10_000;
const PATIENCE_MS = 5_000;

export interface ListenerPorts {
  onNote(note: Note): void;
  /** Listening from here on; what was told before may have been missed. */
  onListening(): void;
  log: Log;
}

export interface Listener {
  /** Makes sure that the connection still answers; one that does not is replaced. */
  check(): void;
  close(): Promise<void>;
}

/** Keeps one connection of this process listening, past any pooler, however often it is lost. */
export function listen(url: string, ports: ListenerPorts): Listener {
  let isClosed = false;
  let current: Connection | null = null;
  let wake = () => {};

  const work = async () => {
    for (let tries = 0; !isClosed; tries += 1) {
      try {
        current = await openConnection(url, ports.onNote);
        // Closed while it was being opened: nobody else would end it.
        if (isClosed) return current.end();
        tries = 0;
        ports.onListening();
        await current.lost;
      } catch (error) {
        if (!isClosed) ports.log.warn({ err: error }, 'Listening failed');
      }
      current = null;
      if (!isClosed) await pause(tries);
    }
  };
  const pause = (tries: number) =>
    new Promise<void>((done) => {
      const timer = setTimeout(done, waitBefore(tries));
      wake = () => {
        clearTimeout(timer);
        done();
      };
    });
  const working = work();

  return {
    check: () => current?.check(),
    async close() {
      isClosed = true;
      current?.end();
      wake();
      await working;
    },
  };
}

/** Doubled from try to try, and spread out, so that many processes do not return in one moment. */
function waitBefore(tries: number): number {
  const most = Math.min(LONGEST_WAIT_MS, FIRST_WAIT_MS * 2 ** tries);
  return most / 2 + (Math.random() * most) / 2;
}

interface Connection {
  /** Settles when the connection is gone, whoever ended it. */
  lost: Promise<void>;
  check(): void;
  end(): void;
}

async function openConnection(url: string, onNote: (note: Note) => void): Promise<Connection> {
  const client = new pg.Client({
    connectionString: url,
    application_name: 'barmkin live',
    connectionTimeoutMillis: PATIENCE_MS,
    query_timeout: PATIENCE_MS,
    keepAlive: true,
  });
  let lose = () => {};
  const lost = new Promise<void>((resolve) => {
    lose = resolve;
  });
  client.on('error', lose);
  client.on('end', lose);
  client.on('notification', ({ payload = '' }) => {
    const note = readNote(payload);
    if (note) onNote(note);
  });
  const end = () => {
    lose();
    client.end().catch(() => undefined);
  };
  try {
    await client.connect();
    await client.query(`listen ${CHANNEL}`);
  } catch (error) {
    end();
    throw error;
  }
  return { lost, end, check: () => void client.query('select 1').catch(end) };
}
