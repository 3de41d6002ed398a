import { useEffect } from 'react';

/** Keeps the screen awake where the browser can; it lets go by itself when the page is hidden. */
export function useWakeLock(wanted: boolean): void {
  useEffect(() => {
    if (!wanted || !('wakeLock' in navigator)) return;
    let lock: WakeLockSentinel | null = null;
    let ended = false;
    const hold = async () => {
      if (document.visibilityState !== 'visible') return;
      try {
        const held = await navigator.wakeLock.request('screen');
        if (ended) await held.release();
        else lock = held;
      } catch {
        // Refused where the battery is low: the page works without it.
      }
    };
    const onVisible = () => void hold();
    document.addEventListener('visibilitychange', onVisible);
    void hold();
    return () => {
      ended = true;
      document.removeEventListener('visibilitychange', onVisible);
      void lock?.release();
    };
  }, [wanted]);
}
