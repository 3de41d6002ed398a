import { isOnline, onConnectionChange } from '../api/connection.ts';

/** Calls when the network is back, the server answers again, or the page is looked at again. */
export function onWake(run: () => void): () => void {
  const seen = () => {
    if (document.visibilityState === 'visible') run();
  };
  const stop = onConnectionChange(() => {
    if (isOnline()) run();
  });
  document.addEventListener('visibilitychange', seen);
  window.addEventListener('pageshow', run);
  return () => {
    stop();
    document.removeEventListener('visibilitychange', seen);
    window.removeEventListener('pageshow', run);
  };
}
