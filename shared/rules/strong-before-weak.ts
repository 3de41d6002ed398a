import { points } from '../units/gravity.ts';
import { missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { toTenth } from './rounding.ts';

interface Detail {
  ogA: number;
  ogB: number;
  fall: number;
}

/** B is far weaker than A. */
export const strongBeforeWeak: Rule<Detail> = {
  id: 'strong-before-weak',

  judge({ a, b, pointsA, pointsB, rules }) {
    if (a.og === undefined || b.og === undefined || pointsA === undefined || pointsB === undefined)
      return unchecked(together(missingOf(a, 'og'), missingOf(b, 'og')));
    const fall = toTenth(pointsA - pointsB);
    if (fall <= 0) return PASSED;
    const detail = { ogA: a.og, ogB: b.og, fall };
    if (fall >= rules.fallHold && pointsA >= points(rules.fallHoldFromOg)) return hold(detail);
    return fall >= rules.fallMind ? mind(detail) : PASSED;
  },

  describe({ standing, detail: { ogA, ogB, fall } }, link, say) {
    const { a, b, A } = namesOf(link);
    const { fallHold, fallMind } = link.rules;
    return {
      title: 'Strong before weak',
      because:
        `${A} at ${say.gravity(ogA)} is ${say.gravityGap(ogA, ogB)} above ${b} at ` +
        `${say.gravity(ogB)}: its yeast is the more tired and its flavour the louder.`,
      do: `Brew ${b} before ${a}, or give it fresh yeast.`,
      measures: [
        measure(
          'Fall in original gravity',
          fall,
          'points',
          standing === 'hold' ? fallHold : fallMind,
        ),
      ],
      basis:
        'Rising strength and flavour: Brew Your Own on repitching yeast; the limits are common practice.',
    };
  },
};
