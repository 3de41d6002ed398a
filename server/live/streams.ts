import type { Stream } from './stream.ts';

/** A browser has one stream, shared by its tabs; some may linger where a connection was lost. */
const MOST_A_SIGN_IN = 8;

/** The open streams of this process. */
export interface Streams {
  /** Takes a stream in; the oldest of the same sign-in gives way where there are too many. */
  add(stream: Stream): void;
  remove(stream: Stream): void;
  all(): Stream[];
  ofSeason(seasonId: string): Iterable<Stream>;
  ofPerson(personId: string): Stream[];
  seasons(): string[];
}

export function createStreams(): Streams {
  const bySeason = new Map<string, Set<Stream>>();
  const byToken = new Map<string, Set<Stream>>();
  const all = () => [...bySeason.values()].flatMap((streams) => [...streams]);

  return {
    add(stream) {
      put(bySeason, stream.seasonId, stream);
      const own = put(byToken, stream.tokenHash, stream);
      const [oldest] = own;
      if (own.size > MOST_A_SIGN_IN) oldest?.end();
    },
    remove(stream) {
      take(bySeason, stream.seasonId, stream);
      take(byToken, stream.tokenHash, stream);
    },
    all,
    ofSeason: (seasonId) => bySeason.get(seasonId) ?? [],
    ofPerson: (personId) => all().filter((stream) => stream.personId === personId),
    seasons: () => [...bySeason.keys()],
  };
}

function put(index: Map<string, Set<Stream>>, key: string, stream: Stream): Set<Stream> {
  const streams = index.get(key) ?? new Set();
  index.set(key, streams.add(stream));
  return streams;
}

function take(index: Map<string, Set<Stream>>, key: string, stream: Stream): void {
  const streams = index.get(key);
  streams?.delete(stream);
  if (streams?.size === 0) index.delete(key);
}
