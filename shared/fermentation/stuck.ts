import type { Say } from '../rules/say.ts';
import { tenThousandths } from './digest.ts';
import { hoursBetween, type Notice, type Watched } from './seen.ts';

/** Common practice: three days without a change is a stop, finished or not. */
export const STEADY_HOURS = 72;
/** Common practice: so far above the expected final gravity is no error of reading. */
export const WELL_ABOVE_SG = 0.005;

/** Hours over which the gravity has not changed, as far as was read; null: nothing to tell by. */
export const steadyHours = ({ followed }: Pick<Watched, 'followed'>): number | null =>
  followed.steadyFrom === null || followed.gravityAt === null
    ? null
    : hoursBetween(followed.steadyFrom, followed.gravityAt);

/** Unchanged over three days, and more than 0.005 above where it should end. */
export function isStuck(watched: Pick<Watched, 'followed' | 'expectedFg'>): boolean {
  const hours = steadyHours(watched);
  const { gravity } = watched.followed;
  if (hours === null || gravity === null || watched.expectedFg === null) return false;
  const above = tenThousandths(gravity) - tenThousandths(watched.expectedFg);
  return hours >= STEADY_HOURS && above > tenThousandths(WELL_ABOVE_SG);
}

export function stuckNotice(watched: Watched, say: Say): Notice | null {
  const { gravity } = watched.followed;
  if (!isStuck(watched) || gravity === null || watched.expectedFg === null) return null;
  return {
    id: 'stuck',
    title: 'Fermentation stuck',
    because: `The gravity has stood at ${say.gravity(gravity)} for three days or more, and ${say.gravity(watched.expectedFg)} was expected.`,
    do: 'Warm it to the upper end of the yeast’s range and rouse the yeast. Do not bottle it: it may go on in the bottle and burst it. Its cake is not for the next beer.',
    basis: 'Unchanged over 3 days and more than 0.005 above the expected end: common practice',
  };
}
