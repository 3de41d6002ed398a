import type { Say } from '../rules/say.ts';
import { apparentAttenuation, gravityAt } from './attenuation.ts';
import { tenThousandths } from './digest.ts';
import type { Notice, Watched } from './seen.ts';

/** Common practice: makers' figures for attenuation spread by about this much, share. */
export const BEYOND_YEAST = 0.08;
/** Diastatic yeast goes beyond 90 % (Meier-Dörnberg et al. 2017). */
export const DIASTATIC = 0.9;
/** A plan that goes lower knows why (enzyme, sugar); beyond it by this much, share: common practice. */
const BEYOND_PLAN = 0.04;

/** The lowest gravity that the yeast should reach, SG; null: the original gravity is not known. */
export function lowestOfYeast(
  watched: Pick<Watched, 'og' | 'plannedFg' | 'attenuation'>,
): number | null {
  const { og, plannedFg, attenuation } = watched;
  if (og === null || og <= 1) return null;
  const own = attenuation === null ? DIASTATIC : attenuation + BEYOND_YEAST;
  const planned = plannedFg === null ? 0 : apparentAttenuation(og, plannedFg) + BEYOND_PLAN;
  return gravityAt(og, Math.max(own, planned));
}

/** The gravity fell below what the yeast can do. A beer with declared wild cultures may. */
export function tooLowNotice(watched: Watched, say: Say): Notice | null {
  const limit = lowestOfYeast(watched);
  const { lowest } = watched.followed;
  if (limit === null || lowest === null || watched.cultures.length > 0) return null;
  if (tenThousandths(lowest) >= tenThousandths(limit)) return null;
  return {
    id: 'too-low',
    title: 'Lower than the yeast goes',
    because: `It was read at ${say.gravity(lowest)}; this yeast should stop above ${say.gravity(limit)}.`,
    do: 'Check the instrument first. If it is right, a wild yeast or an enzyme may be at work: taste it, keep it apart, and give the next beer fresh yeast. Bottles may burst.',
    basis:
      watched.attenuation === null
        ? 'Beyond 90 % apparent attenuation: Meier-Dörnberg et al. 2017, diastatic yeast'
        : 'More than 8 points beyond the yeast’s own attenuation, or 4 beyond the plan: common practice',
  };
}
