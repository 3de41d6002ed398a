import { randomUUID } from 'node:crypto';
import type { Response } from 'express';
import type { Clock } from '../clock.ts';
import type { Config } from '../config.ts';
import type { Db } from '../db/client.ts';
import type { Log } from '../log.ts';
import { outcasts, revisionsOf } from './admission.ts';
import { createArrivals } from './arrivals.ts';
import { createGuestNews } from './guestNews.ts';
import { listen } from './listener.ts';
import { openStream, writeEvent, type Stream, type Watcher } from './stream.ts';
import { createStreams, type Streams } from './streams.ts';

export interface LiveDeps {
  config: Pick<Config, 'listenUrl' | 'heartbeatMs'>;
  db: Db;
  clock: Clock;
  log: Log;
}

/** The open streams of this process, and what wakes them. Nothing of it matters when it is gone. */
export interface Live {
  /** Answers with a stream that stays open. */
  open(res: Response, watcher: Omit<Watcher, 'streamId'>, since?: number): void;
  /** Ends all streams, so that a server can stop; the clients come back elsewhere. */
  close(): Promise<void>;
}

/** Streams begin anew now and then: a client that silently went away is then no longer here. */
const LONGEST_MS = 10 * 60_000;

interface Scene extends LiveDeps {
  streams: Streams;
}

export function startLive(deps: LiveDeps): Live {
  const { config, log } = deps;
  const scene = { ...deps, streams: createStreams() };
  const { streams } = scene;
  const arrivals = createArrivals(scene);
  const hello = writeEvent('hello', { beatMs: config.heartbeatMs });
  let isClosed = false;
  const tried = (what: string, work: Promise<unknown>) =>
    void work.catch((error: unknown) => {
      if (!isClosed) log.warn({ err: error }, what);
    });
  const guests = createGuestNews(deps.db, streams, tried);
  const listener = listen(config.listenUrl, {
    log,
    onNote(note) {
      if (note.kind === 'here') arrivals.changed(note.seasonId);
      else if (note.kind === 'season') {
        advance(streams.ofSeason(note.seasonId), note.revision);
        guests.changed(note.seasonId);
      } else {
        const own = streams.ofPerson(note.personId);
        if (own.length > 0) tried('Streams not checked', expel(scene, own).then(guests.follow));
      }
    },
    onListening() {
      tried('Streams not caught up', catchUp(scene, streams.seasons()));
      for (const seasonId of streams.seasons()) arrivals.changed(seasonId);
      guests.again();
    },
  });
  const beating = setInterval(() => {
    listener.check();
    beat(streams);
    // A note that came while the database could not be asked is made good here.
    tried('Streams not caught up', catchUp(scene, streams.seasons()));
    tried('Streams not checked', expel(scene, streams.all()).then(guests.follow));
    tried('Presence not renewed', arrivals.renew());
  }, config.heartbeatMs);

  return {
    open(res, watcher, since = -1) {
      // Gone while it was found out who asks.
      if (!res.socket || res.socket.destroyed) return;
      const stream = openStream(res, { ...watcher, streamId: randomUUID() });
      stream.revision = since;
      stream.send(hello);
      // In the hub first, then the revision is read: what comes between is told twice, never missed.
      streams.add(stream);
      arrivals.come(stream);
      tried('Stream not caught up', catchUp(scene, [stream.seasonId], stream));
      tried('Stream without guests', guests.follow());
      res.on('close', () => {
        streams.remove(stream);
        arrivals.go(stream);
      });
      if (isClosed) stream.end();
    },
    async close() {
      isClosed = true;
      clearInterval(beating);
      for (const stream of streams.all()) stream.end();
      await Promise.all([listener.close(), arrivals.close().catch(() => undefined)]);
    },
  };
}

function beat(streams: Streams): void {
  const now = performance.now();
  for (const stream of streams.all()) {
    if (now - stream.since > LONGEST_MS) stream.end();
    else stream.beat();
  }
}

function advance(streams: Iterable<Stream>, revision: number): void {
  const event = writeEvent('revision', { revision });
  for (const stream of streams) {
    if (revision <= stream.revision) continue;
    stream.revision = revision;
    stream.send(event);
  }
}

/** Tells where the seasons are now; nobody who is there already hears of it. */
async function catchUp({ db, streams }: Scene, seasonIds: string[], only?: Stream): Promise<void> {
  for (const { id, revision } of await revisionsOf(db, seasonIds))
    advance(only ? [only] : streams.ofSeason(id), revision);
}

/** Ends the streams of those who are signed out, or no longer of the brewery. */
async function expel({ db, clock }: Scene, streams: readonly Stream[]): Promise<void> {
  const out = await outcasts(db, clock, streams);
  for (const stream of streams) {
    const why = out.get(stream.streamId);
    if (why) stream.end(why);
  }
}
