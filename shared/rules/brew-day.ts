import { missingForWait } from './missing.ts';
import { namesOf } from './names.ts';
import type { VesselDays } from './linkState.ts';
import { hold, measure, PASSED, unchecked, type Rule } from './outcome.ts';
import { days } from './say.ts';

interface Detail {
  /** The batch that still occupies the vessel, or null where the yeast is not taken yet. */
  takenBy: string | null;
  waitDays: number;
}

/** B is brewed before A's yeast is taken; or, on the board, before its vessel is free. */
export const brewDay = {
  id: 'brew-day',

  judge({ a, b, pour, times: { waitDays }, board }: VesselDays) {
    if (waitDays !== undefined && waitDays < 0) return hold({ takenBy: null, waitDays });
    if (board?.vesselTakenBy !== undefined)
      return hold({ takenBy: board.vesselTakenBy, waitDays: waitDays ?? 0 });
    return waitDays === undefined ? unchecked(missingForWait(a, b, pour)) : PASSED;
  },

  describe({ detail: { takenBy, waitDays } }, link, say) {
    const { a, b, B } = namesOf(link);
    const brewed = link.b.brewOn === undefined ? 'then' : `on ${say.day(link.b.brewOn)}`;
    if (takenBy !== null)
      return {
        title: 'Vessel not free',
        because: `${B} is brewed ${brewed}, and ${takenBy} is still in its vessel.`,
        do: `Brew ${b} in another vessel, or when ${takenBy} is racked.`,
        measures: [],
        basis: 'Arithmetic of the dates',
      };
    const { takenOn } = link.times;
    const taken = takenOn === undefined ? 'later' : say.day(takenOn);
    return {
      title: 'Brewed before racking',
      because: `${B} is brewed ${brewed}, ${days(-waitDays)} before the yeast of ${a} is taken on ${taken}.`,
      do: `Brew ${b} on ${taken} or after it.`,
      measures: [measure('Wait of the cake', waitDays, 'days', 0)],
      basis: 'Arithmetic of the dates',
    };
  },
} satisfies Rule<Detail>;
