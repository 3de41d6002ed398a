import { hasFallen } from './digest.ts';
import { hoursBetween, type Notice, type Watched } from './seen.ts';

/** Common practice: ale yeast in good heart shows itself within half a day to a day. */
export const LAG_HOURS = 24;

/** When it met its yeast, as far as is known: the pour, else the first gravity that was read. */
export const startOf = ({ followed }: Pick<Watched, 'followed'>): string | null =>
  followed.pouredAt ?? followed.firstGravityAt;

/**
 * Hours from the start to the last reading that showed no fall; null where none tells. The lag was
 * at least that long.
 */
export function lagAtLeast({ followed, og }: Pick<Watched, 'followed' | 'og'>): number | null {
  const start = startOf({ followed });
  if (start === null || followed.stillAt === null || followed.firstGravity === null) return null;
  if (og !== null && hasFallen(og, followed.firstGravity)) return null;
  return Math.max(0, hoursBetween(start, followed.stillAt));
}

/** Hours from the start to the first reading that showed a fall; null: none has. */
export function lagAtMost({ followed, og }: Pick<Watched, 'followed' | 'og'>): number | null {
  const start = startOf({ followed });
  if (start === null || followed.firstGravity === null) return null;
  if (og !== null && hasFallen(og, followed.firstGravity))
    return followed.pouredAt === null || followed.firstGravityAt === null
      ? null
      : hoursBetween(start, followed.firstGravityAt);
  return followed.begunAt === null ? null : hoursBetween(start, followed.begunAt);
}

/** No fall of gravity more than a day after the pour. */
export function lagNotice(watched: Watched): Notice | null {
  const hours = lagAtLeast(watched);
  if (hours === null || hours <= LAG_HOURS) return null;
  const begun = watched.followed.begunAt !== null;
  return {
    id: 'lag',
    title: 'Slow to start',
    because: `The gravity had not moved ${Math.floor(hours)} hours after the start.`,
    do: begun
      ? 'It has begun since. Judge its cake with care: a long lag speaks of tired or too little yeast.'
      : 'Look for foam and bring the wort into the yeast’s range. Without a sign by tomorrow, pitch fresh yeast.',
    basis: `More than ${LAG_HOURS} hours: common practice`,
  };
}
