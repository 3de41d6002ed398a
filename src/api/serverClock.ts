/**
 * By how much this device's clock is off: the server's time less the device's, in the middle of the
 * quickest request so far. A brew day's times are the device's, put right by this.
 */
export interface ServerClock {
  /** Milliseconds to add to the device's clock. */
  offsetMs(): number;
  /** The server's time now, as well as it is known; milliseconds since 1970. */
  now(): number;
  /** Asks, and measures by the `now` of the answer. */
  measured<T extends { now: string }>(ask: () => Promise<T>): Promise<T>;
}

export function createServerClock(deviceNow: () => number): ServerClock {
  let offset = 0;
  let quickest = Number.POSITIVE_INFINITY;
  let last = 0;
  return {
    offsetMs: () => offset,
    now: () => deviceNow() + offset,
    async measured(ask) {
      const sent = deviceNow();
      const answer = await ask();
      const came = deviceNow();
      const took = came - sent;
      const found = Math.round(Date.parse(answer.now) - (sent + took / 2));
      // A clock that was set in between is believed at once; else the quickest answer is the best.
      const wasSet = Math.abs(found - offset) > Math.max(took, 0) + Math.max(last, 0) + 1000;
      if (took >= 0 && (took <= quickest || wasSet)) {
        offset = found;
        quickest = took;
      }
      last = took;
      return answer;
    },
  };
}

export const serverClock = createServerClock(Date.now);
