import { points } from '../units/gravity.ts';
import type { LinkState } from './linkState.ts';
import { missingOf } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { atMost } from './say.ts';

/** Living share of a cell count from which a strong beer's cake may be used with care. */
const ENOUGH_ALIVE = 0.9;

interface Detail {
  og: number | undefined;
  abv: number | undefined;
  /** Over the hold limits; where the verdict is a mind all the same, the cells were counted. */
  over: 'mind' | 'hold';
}

/** A was strong enough to have worn its yeast out. */
export const tiredCake: Rule<Detail> = {
  id: 'tired-cake',

  judge(link) {
    const { a, rules, abvA: abv } = link;
    if (above(link, rules.tiredOgHold, rules.tiredAbvHold)) {
      const counted = (a.measuredCake?.viability ?? 0) >= ENOUGH_ALIVE;
      return (counted ? mind : hold)({ og: a.og, abv, over: 'hold' });
    }
    if (above(link, rules.tiredOgMind, rules.tiredAbvMind))
      return mind({ og: a.og, abv, over: 'mind' });
    return abv === undefined ? unchecked(missingOf(a, 'og', 'fg')) : PASSED;
  },

  describe({ standing, detail: { og, abv, over } }, link, say) {
    const { b, A } = namesOf(link);
    const { rules } = link;
    const ogLimit = over === 'hold' ? rules.tiredOgHold : rules.tiredOgMind;
    const abvLimit = over === 'hold' ? rules.tiredAbvHold : rules.tiredAbvMind;
    const counted = over === 'hold' && standing === 'mind';
    return {
      title: 'Tired cake',
      because:
        `${A} was brewed at ${og === undefined ? 'an unknown gravity' : say.gravity(og)}` +
        `${abv === undefined ? '' : ` and holds ${atMost(abv, 1)} % ABV`}` +
        `${counted ? ', though the cell count says that most cells are alive' : ', which wears yeast out'}.`,
      do:
        standing === 'hold'
          ? `Count the cells, with ${say.percent(ENOUGH_ALIVE)} or more alive it may be poured with care; or give ${b} fresh yeast.`
          : `Pour ${b} onto the cake of a beer of at most ${say.gravity(rules.tiredOgMind)} and ${atMost(rules.tiredAbvMind, 1)} % ABV, or onto fresh yeast.`,
      measures: [
        ...(og === undefined ? [] : [measure('Original gravity', og, 'SG', ogLimit)]),
        ...(abv === undefined ? [] : [measure('Alcohol', Number(atMost(abv, 2)), '%', abvLimit)]),
      ],
      basis:
        'Yeast makers take no cakes from above 18 °P; dead cells rise with alcohol (Fernández et al. 1985); the lower limits are common practice.',
    };
  },
};

const above = ({ pointsA, abvA }: LinkState, og: number, abv: number): boolean =>
  (pointsA !== undefined && pointsA > points(og)) || (abvA !== undefined && abvA > abv);
