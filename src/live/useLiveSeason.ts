import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect, useSyncExternalStore } from 'react';
import { boardQuery } from '../api/board.ts';
import { sessionQuery } from '../api/session.ts';
import { createCatchUp } from './catchUp.ts';
import { catchUpGuests } from './catchUpGuests.ts';
import { keepConnected, type Told } from './connection.ts';
import { fetchEvents } from './fetchEvents.ts';
import { liveStore } from './liveStore.ts';
import { onWake } from './onWake.ts';
import { readFailedAgain } from './readFailedAgain.ts';
import { shareStream } from './shareStream.ts';

export const useLive = () => useSyncExternalStore(liveStore.subscribe, liveStore.get);

/** Keeps the board of a brewery's season up to date with everybody else's, for as long as it is shown. */
export function useLiveSeason(slug: string) {
  const client = useQueryClient();
  const { data: seasonId } = useQuery({
    ...boardQuery(slug),
    select: (board) => board.season.id,
  });
  useEffect(() => {
    if (seasonId === undefined) return;
    const catchUp = createCatchUp(client, slug, seasonId);
    const guests = catchUpGuests(client, slug);
    const hear = (told: Told) => {
      switch (told.kind) {
        case 'state':
          return liveStore.set({ state: told.state });
        case 'here':
          return liveStore.set({ here: told.people });
        case 'revision':
          return catchUp.heard(told.revision);
        case 'elsewhere':
          // The list of one's guest shelves bears their names, so one's own board is read as well.
          catchUp.elsewhere();
          return guests.elsewhere();
        case 'ended':
          // Who asks is told by the shell: to sign in, or that there is nothing here.
          return void client.invalidateQueries(sessionQuery);
        case 'beat':
          catchUp.again();
          readFailedAgain(client);
          return guests.again();
      }
    };
    const stop = watch(slug, seasonId, hear);
    return () => {
      stop();
      liveStore.reset();
    };
  }, [client, slug, seasonId]);
}

function after(ms: number, run: () => void) {
  const timer = window.setTimeout(run, ms);
  return () => window.clearTimeout(timer);
}

function watch(slug: string, seasonId: string, hear: (told: Told) => void): () => void {
  const name = `barmkin live ${seasonId}`;
  const lead = (tell: (told: Told) => void) => {
    const connection = keepConnected({
      open: (since, hearing, signal) => fetchEvents({ slug, seasonId, since }, hearing, signal),
      tell,
      after,
      onWake,
      // The other clock stands still while a machine sleeps.
      now: Date.now,
      random: Math.random,
    });
    return connection.stop;
  };
  return shareStream(name, {
    locks: 'locks' in navigator ? navigator.locks : null,
    channel: 'BroadcastChannel' in window ? new BroadcastChannel(name) : null,
    lead,
    hear,
    after,
    isVisible: () => document.visibilityState === 'visible',
  });
}
