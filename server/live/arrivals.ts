import type { Config } from '../config.ts';
import type { Db } from '../db/client.ts';
import type { Log } from '../log.ts';
import { arrive, depart, hereIn, sweep } from './presence.ts';
import { writeEvent, type Stream } from './stream.ts';
import type { Streams } from './streams.ts';

/** Who reloads a page does not leave and come again. */
const GRACE_MS = 2_000;
/** Many who come at once are announced together. */
const GATHER_MS = 100;

export interface Arrivals {
  come(stream: Stream): void;
  go(stream: Stream): void;
  /** Somebody came or went, at whichever process. */
  changed(seasonId: string): void;
  /** At each heartbeat: the rows of this process's streams, and who is here by now. */
  renew(): Promise<void>;
  close(): Promise<void>;
}

interface Scene {
  config: Pick<Config, 'heartbeatMs'>;
  db: Db;
  log: Log;
  streams: Streams;
}

/** Keeps the rows of who is here, and announces them where they changed. */
export function createArrivals({ config, db, log, streams }: Scene): Arrivals {
  const leaving = new Map<string, NodeJS.Timeout>();
  const dirty = new Set<string>();
  let gathering: NodeJS.Timeout | null = null;
  let isClosed = false;
  const tried = (work: Promise<unknown>) =>
    void work.catch((error: unknown) => {
      if (!isClosed) log.warn({ err: error }, 'Presence not written');
    });

  const announce = async (seasonIds: readonly string[]) => {
    const watched = seasonIds.filter((id) => [...streams.ofSeason(id)].length > 0);
    if (watched.length === 0) return;
    const here = await hereIn(db, watched, config.heartbeatMs);
    for (const id of watched) tellHere(streams.ofSeason(id), here.get(id) ?? []);
  };

  return {
    come: (stream) => tried(arrive(db, [stream])),
    go({ streamId }) {
      if (isClosed) return;
      const leave = () => {
        leaving.delete(streamId);
        tried(depart(db, [streamId]));
      };
      leaving.set(streamId, setTimeout(leave, GRACE_MS));
    },
    changed(seasonId) {
      dirty.add(seasonId);
      gathering ??= setTimeout(() => {
        gathering = null;
        const ids = [...dirty];
        dirty.clear();
        tried(announce(ids));
      }, GATHER_MS);
    },
    async renew() {
      await arrive(db, streams.all());
      await sweep(db, config.heartbeatMs);
      await announce(streams.seasons());
    },
    async close() {
      isClosed = true;
      if (gathering) clearTimeout(gathering);
      for (const timer of leaving.values()) clearTimeout(timer);
      const left = [...leaving.keys(), ...streams.all().map(({ streamId }) => streamId)];
      await depart(db, left);
    },
  };
}

function tellHere(streams: Iterable<Stream>, people: string[]): void {
  const here = people.join();
  const event = writeEvent('here', { people });
  for (const stream of streams) {
    if (stream.here === here) continue;
    stream.here = here;
    stream.send(event);
  }
}
