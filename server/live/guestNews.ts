import { createHash } from 'node:crypto';
import type { Db } from '../db/client.ts';
import { loadBoardRows } from '../routes/board/load.ts';
import { guestView } from '../routes/guests/view.ts';
import { guestChains, type GuestChain } from './admission.ts';
import { writeEvent, type Stream } from './stream.ts';
import type { Streams } from './streams.ts';

/**
 * Tells guests that a chain which stands on their own board changed. A season's revision says that
 * anything of it did, which is not their business: so each chain is looked at as a guest sees it,
 * and only a difference is told. Nothing of it, not even which chain, is in the event.
 */
export interface GuestNews {
  /** Finds out anew which chains the streams' people are guests of. */
  follow(): Promise<void>;
  /** Something of this season changed. */
  changed(seasonId: string): void;
  /** Notes may have been missed: all are looked at. */
  again(): void;
}

/** Changes that come together are looked at once. */
const GATHER_MS = 50;

const ELSEWHERE = writeEvent('elsewhere', {});

export function createGuestNews(
  db: Db,
  streams: Streams,
  tried: (what: string, work: Promise<unknown>) => void,
): GuestNews {
  let watched: readonly GuestChain[] = [];
  /** What a guest saw of a chain when it was last looked at. */
  const looks = new Map<string, string>();
  const welcomed = new WeakSet<Stream>();
  const dirty = new Set<string>();
  let gathering: NodeJS.Timeout | null = null;
  // One after the other, so that an older look never comes after a newer one.
  let working: Promise<void> = Promise.resolve();
  const inTurn = (work: () => Promise<void>) => (working = working.catch(() => {}).then(work));

  const lookAtDirty = async () => {
    for (const seasonId of dirty) {
      dirty.delete(seasonId);
      try {
        const here = watched.filter((each) => each.seasonId === seasonId);
        for (const stream of streamsOf(streams, await changedAmong(db, here, looks)))
          stream.send(ELSEWHERE);
      } catch (error) {
        // Once more with the next heartbeat.
        dirty.add(seasonId);
        throw error;
      }
    }
  };
  const follow = async () => {
    const people = [...new Set(streams.all().map(({ personId }) => personId))];
    watched = await guestChains(db, people);
    const ids = new Set(watched.map(({ chainId }) => chainId));
    for (const id of looks.keys()) if (!ids.has(id)) looks.delete(id);
    const added = watched.filter(({ chainId }) => !looks.has(chainId));
    await changedAmong(db, added, looks);
    for (const stream of streamsOf(streams, watched)) {
      if (welcomed.has(stream)) continue;
      // What changed since their page read the chain, and before it was looked at, is read by this.
      welcomed.add(stream);
      stream.send(ELSEWHERE);
    }
    await lookAtDirty();
  };
  const soon = () => {
    gathering ??= setTimeout(() => {
      gathering = null;
      tried('Guests not told', inTurn(lookAtDirty));
    }, GATHER_MS);
  };
  const changed = (seasonId: string) => {
    if (!watched.some((each) => each.seasonId === seasonId)) return;
    dirty.add(seasonId);
    soon();
  };
  return {
    follow: () => inTurn(follow),
    changed,
    again: () => watched.forEach(({ seasonId }) => changed(seasonId)),
  };
}

/** Streams of the boards on which these chains stand. */
function streamsOf(streams: Streams, chains: readonly GuestChain[]): Stream[] {
  const boards = new Set(chains.map(({ personId, boardOf }) => `${personId} ${boardOf}`));
  return streams.all().filter(({ personId, breweryId }) => boards.has(`${personId} ${breweryId}`));
}

/** Those of the chains that look otherwise than before; how they look now is kept. */
async function changedAmong(
  db: Db,
  chains: readonly GuestChain[],
  looks: Map<string, string>,
): Promise<GuestChain[]> {
  const now = new Map<string, string>();
  for (const seasonId of new Set(chains.map((each) => each.seasonId))) {
    const here = chains.filter((each) => each.seasonId === seasonId);
    for (const [id, seen] of await looksOf(db, here)) now.set(id, seen);
  }
  const changed = chains.filter(({ chainId }) => looks.get(chainId) !== now.get(chainId));
  for (const [id, seen] of now) looks.set(id, seen);
  return changed;
}

/** @param chains of one season */
async function looksOf(db: Db, chains: readonly GuestChain[]): Promise<Map<string, string>> {
  const [first] = chains;
  if (!first) return new Map();
  const rows = await loadBoardRows(db, first.ownerId, first.seasonId);
  return new Map(
    chains.map(({ chainId, ownerName }) => {
      if (!rows) return [chainId, 'gone'];
      const seen = guestView({ ...rows, today: '' }, [chainId], ownerName);
      // The revision counts what happens to the other chains too.
      const { revision: _revision, version: _version, ...season } = seen.season;
      const text = JSON.stringify({ ...seen, season });
      return [chainId, createHash('sha256').update(text).digest('base64url')];
    }),
  );
}
