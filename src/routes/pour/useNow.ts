import { useEffect, useState } from 'react';
import { serverClock } from '../../api/serverClock.ts';

/** The server's time, kept current: a forecast moves with the clock. */
export function useNow(everyMs: number): number {
  const [now, setNow] = useState(serverClock.now);
  useEffect(() => {
    const tick = () => setNow(serverClock.now());
    const timer = window.setInterval(tick, everyMs);
    // A telephone that slept shows the time at once.
    document.addEventListener('visibilitychange', tick);
    return () => {
      window.clearInterval(timer);
      document.removeEventListener('visibilitychange', tick);
    };
  }, [everyMs]);
  return now;
}
