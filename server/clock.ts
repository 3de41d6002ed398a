export interface Clock {
  now(): Date;
}

export const systemClock: Clock = { now: () => new Date() };

/** A clock that starts at an instant and runs on from there. */
export function clockFrom(start: Date): Clock {
  const offset = start.getTime() - Date.now();
  return { now: () => new Date(Date.now() + offset) };
}
