/**
 * By how much this device's clock is off. The server's time in an answer was the device's at some
 * moment between asking and hearing, so the truth lies within half of that time of the middle. An
 * offset that lies there stays, so that times do not jump about; one that cannot be right is
 * replaced, as when somebody set the clock. A brew day's times are the device's, put right by this.
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
  return {
    offsetMs: () => offset,
    now: () => deviceNow() + offset,
    async measured(ask) {
      const sent = deviceNow();
      const answer = await ask();
      const half = (deviceNow() - sent) / 2;
      const found = Math.round(Date.parse(answer.now) - (sent + half));
      // Less than nothing: the clock was set while the answer was on its way.
      if (half >= 0 && Math.abs(found - offset) > half + 1) offset = found;
      return answer;
    },
  };
}

export const serverClock = createServerClock(Date.now);
