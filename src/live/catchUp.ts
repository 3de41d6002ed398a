import type { QueryClient } from '@tanstack/react-query';
import { boardQuery } from '../api/board.ts';
import { pendingOf } from '../api/pendingStore.ts';
import { boardStillness } from '../api/stillness.ts';

export interface CatchUp {
  /** The server is at this revision. */
  heard(revision: number): void;
  /** Something that the revision does not count changed: a chain that is here as a guest. */
  elsewhere(): void;
  /** At each heartbeat: a read that failed is tried again. */
  again(): void;
}

/**
 * Reads the board anew where the server is ahead of it. A read that is under way already, or moves
 * of one's own that are, are waited for: mostly they bring what was heard of. What is read waits for
 * the end of a drag by itself (`boardQuery`).
 */
export function createCatchUp(client: QueryClient, slug: string, seasonId: string): CatchUp {
  const { queryKey } = boardQuery(slug);
  let wanted = -1;
  let isForced = false;
  let isWorking = false;

  const isBehind = () => {
    const board = client.getQueryData(queryKey);
    // Where another season has become the current one, its own revisions count.
    if (board === undefined || board.season.id !== seasonId) return false;
    return isForced || board.season.revision < wanted;
  };
  /** A board that no page shows is not read, only marked as old: to wait for that read would never end. */
  const isShown = () => client.getQueryCache().find({ queryKey })?.isActive() ?? false;
  const work = async () => {
    // A read that waits for the end of a drag is older than what was heard since.
    if (isWorking && boardStillness.isHeld()) void client.invalidateQueries({ queryKey });
    if (isWorking) return;
    isWorking = true;
    await atRest(client, slug);
    while (isBehind()) {
      const wasForced = isForced;
      isForced = false;
      await client.invalidateQueries({ queryKey });
      if (!isShown()) break;
      if (client.getQueryState(queryKey)?.status === 'error') {
        // What was asked for is still to be read, at the next heartbeat or when the connection is back.
        isForced ||= wasForced;
        break;
      }
      await atRest(client, slug);
    }
    isWorking = false;
  };
  return {
    heard(revision) {
      wanted = Math.max(wanted, revision);
      void work();
    },
    elsewhere() {
      isForced = true;
      void work();
    },
    again: () => void work(),
  };
}

async function atRest(client: QueryClient, slug: string): Promise<void> {
  const { queryKey } = boardQuery(slug);
  const pending = pendingOf(slug);
  await until(
    () => pending.get().length === 0,
    (look) => pending.subscribe(look),
  );
  await until(
    () => client.getQueryState(queryKey)?.fetchStatus !== 'fetching',
    (look) => client.getQueryCache().subscribe(look),
  );
}

function until(holds: () => boolean, subscribe: (look: () => void) => () => void): Promise<void> {
  if (holds()) return Promise.resolve();
  return new Promise((resolve) => {
    const stop = subscribe(() => {
      if (!holds()) return;
      stop();
      resolve();
    });
  });
}
