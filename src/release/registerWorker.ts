import { Workbox } from 'workbox-window';
import { releaseStore } from './releaseStore.ts';

const AN_HOUR_MS = 60 * 60 * 1000;

let registered = false;

/**
 * Registers the service worker, which keeps the pages for when there is no connection. A newer one
 * waits until somebody says so; only the tab in which that was said is loaded anew.
 */
export async function registerWorker(): Promise<void> {
  if (registered || !import.meta.env.PROD || !('serviceWorker' in navigator)) return;
  registered = true;
  const worker = new Workbox('/sw.js');
  const take = () => {
    worker.addEventListener('controlling', () => location.reload());
    worker.messageSkipWaiting();
  };
  worker.addEventListener('waiting', () => releaseStore.ready(take));
  try {
    await worker.register();
    window.setInterval(() => void worker.update().catch(() => undefined), AN_HOUR_MS);
  } catch {
    // Shut off in this browser: the pages then need a connection, and work as ever with one.
  }
}
