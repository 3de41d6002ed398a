import { addDays } from '../units/day.ts';
import type { LinkState } from './linkState.ts';
import { missingOf } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { atMost, days, type Say } from './say.ts';

/** Days before which a cake is still at work (common practice). */
const EARLIEST = { ale: 5, lager: 10 } as const;
/** A strong beer wears the cake out sooner (common practice). */
const STRONG_ABV = 7;
const LATEST_STRONG = 21;

interface Detail {
  days: number;
  limit: number;
  why: 'early' | 'late' | 'strong';
}

/** A's yeast is taken too early, or lies too long under its beer. */
export const timeUnderBeer: Rule<Detail> = {
  id: 'time-under-beer',

  judge({ a, pour, yeast, times, rules, abvA }) {
    const count = times.underBeerDays;
    if (count === undefined)
      return unchecked(missingOf(a, pour.takenOn === undefined ? 'daysUnderBeer' : 'brewOn'));
    const lager = yeast.kind === 'lager';
    const held = lager ? rules.underBeerHoldLager : rules.underBeerHold;
    const late = lager ? rules.underBeerMindLager : rules.underBeerMind;
    if (count > held) return hold({ days: count, limit: held, why: 'late' });
    if (count < EARLIEST[yeast.kind])
      return mind({ days: count, limit: EARLIEST[yeast.kind], why: 'early' });
    if (count > late) return mind({ days: count, limit: late, why: 'late' });
    if (count <= LATEST_STRONG) return PASSED;
    if (abvA === undefined) return unchecked(missingOf(a, 'og', 'fg'));
    return abvA > STRONG_ABV ? mind({ days: count, limit: LATEST_STRONG, why: 'strong' }) : PASSED;
  },

  describe({ detail }, link, say) {
    const { a, A } = namesOf(link);
    const { days: count, limit, why } = detail;
    const early = why === 'early';
    const alcohol = why === 'strong' ? ` at ${atMost(link.abvA ?? 0, 1)} % ABV` : '';
    return {
      title: early ? 'Yeast taken early' : 'Long under beer',
      because: early
        ? `The yeast of ${a} is taken after ${days(count)}; before day ${limit} it is still at work.`
        : `${A} lies on its yeast for ${days(count)}${alcohol}; ${days(limit)} are the limit.`,
      do: `Take the yeast of ${a} ${byWhen(detail, link, say)}.`,
      measures: [measure('Days under beer', count, 'days', limit)],
      basis:
        'Common practice; no published viability of a cake under beer at cellar temperature was found.',
    };
  },
};

/** The nearest day that clears the finding. */
function byWhen({ limit, why }: Detail, link: LinkState, say: Say): string {
  const { rules, yeast, a } = link;
  const late = yeast.kind === 'lager' ? rules.underBeerMindLager : rules.underBeerMind;
  const strong = (link.abvA ?? 0) > STRONG_ABV;
  const day = why === 'early' ? limit : strong ? Math.min(late, LATEST_STRONG) : late;
  const when = a.brewOn === undefined ? `day ${day}` : `${say.day(addDays(a.brewOn, day))}`;
  return why === 'early' ? `on ${when} or later` : `on ${when} or earlier`;
}
