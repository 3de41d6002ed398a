import { isOnline, onConnectionChange } from '../api/connection.ts';
import { layIn } from '../api/layIn.ts';
import { queryClient } from '../api/queryClient.ts';
import { sessionQuery } from '../api/session.ts';
import { createOutbox } from './createOutbox.ts';
import { sendEntry } from './sendEntry.ts';
import { spaced } from './spaced.ts';
import { deviceStorage } from './storage.ts';

const NAME = 'barmkin outbox';
const AGAIN_MS = 15_000;
const PATIENCE_MS = 4_000;
/** Where reading goes through and sending does not, the connection seems to come back all the time. */
const PAUSE_MS = 3_000;

const channel = 'BroadcastChannel' in globalThis ? new BroadcastChannel(NAME) : null;

/** Where the browser has no locks, tabs might send at once: the server then does each once all the same. */
let before: Promise<void> = Promise.resolve();
function alone(work: () => Promise<void>): Promise<void> {
  if ('locks' in navigator) return navigator.locks.request(NAME, work);
  before = before.then(work, work);
  return before;
}

/** The outbox of this device. */
export const outbox = createOutbox({
  storage: deviceStorage,
  send: sendEntry,
  person: () => queryClient.getQueryData(sessionQuery.queryKey)?.id ?? null,
  alone,
  taken: (entry, answer) => {
    const name = queryClient.getQueryData(sessionQuery.queryKey)?.name ?? '';
    for (const queryKey of entry.touches) {
      const isThere = layIn(queryClient, queryKey, { entry, answer, name });
      void queryClient.invalidateQueries({ queryKey, refetchType: isThere ? 'none' : 'active' });
    }
  },
  isHopeful: isOnline,
  patience: () => new Promise((resolve) => window.setTimeout(resolve, PATIENCE_MS)),
  tell: () => channel?.postMessage('changed'),
});

/** Shows what waits, and sends it whenever there is hope. The answer stops it. */
export function watchOutbox(): () => void {
  const quietly = (work: Promise<void>) => void work.catch(() => undefined);
  const tries = spaced(PAUSE_MS, () => quietly(outbox.flush()));
  const tryNow = () => {
    if (isOnline() && outbox.get().length > 0) tries.ask();
  };
  const begin = async () => {
    await outbox.look();
    tryNow();
  };
  if (channel) channel.onmessage = () => quietly(outbox.look());
  quietly(begin());
  const timer = window.setInterval(tryNow, AGAIN_MS);
  const stop = onConnectionChange(tryNow);
  return () => {
    stop();
    tries.stop();
    window.clearInterval(timer);
    if (channel) channel.onmessage = null;
  };
}
