import { linkBlend } from './linkBlend.ts';
import type { LinkState } from './linkState.ts';
import { missingForBlend, missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { milder, recommendedInstead, type Graded } from './remedies.ts';
import { toHundredth } from './rounding.ts';
import { atMost, type Say } from './say.ts';

interface Detail {
  srmA: number;
  srmB: number;
  shift: number;
}

/** A is darker than B, and what stays of it moves B's colour so that one sees it in a glass. */
export const lightToDark: Rule<Detail> = {
  id: 'light-to-dark',

  judge(link) {
    const { a, b, rules } = link;
    if (link.kept.retainedL === 0) return PASSED;
    if (a.srm === undefined || b.srm === undefined)
      return unchecked(together(missingOf(a, 'srm'), missingOf(b, 'srm')));
    const srmA = toHundredth(a.srm);
    const srmB = toHundredth(b.srm);
    if (toHundredth(srmA - srmB) < rules.darkSrm) return PASSED;
    const shift = link.colourShift;
    if (shift === undefined) return unchecked(missingForBlend(link));
    const standing = standingAt(shift, link);
    if (standing === 'passed') return PASSED;
    return (standing === 'hold' ? hold : mind)({ srmA, srmB, shift });
  },

  describe({ standing, detail: { srmA, srmB, shift } }, link, say) {
    const { a, b, A } = namesOf(link);
    const { darkSrm, colourShiftMind, colourShiftHold } = link.rules;
    const blended = link.blend.srm ?? srmB;
    return {
      title: 'Dark before light',
      because:
        `${A} has ${say.colour(srmA)} and ${b} ${say.colour(srmB)}: the beer in the cake moves ` +
        `it to ${say.colour(blended)}, a difference of ${atMost(shift, 1)} in the glass.`,
      do: lessCake(link, standing, say) ?? `Brew ${b} before ${a}, or give it fresh yeast.`,
      measures: [
        measure('Colour of the earlier beer', srmA, 'SRM', toHundredth(srmB + darkSrm)),
        measure('Colour of the new beer', srmB, 'SRM'),
        measure('Colour as poured', toHundredth(blended), 'SRM'),
        measure(
          'Colour shift',
          toHundredth(shift),
          'ΔE00',
          standing === 'hold' ? colourShiftHold : colourShiftMind,
        ),
      ],
      basis:
        'Order: common practice. Colour: mean spectrum of beer (deLange 2016, from memory) seen ' +
        'through 5 cm and compared by CIEDE2000; about 1 is just visible.',
    };
  },
};

function standingAt(shift: number, { rules }: LinkState): Graded {
  if (shift >= rules.colourShiftHold) return 'hold';
  return shift >= rules.colourShiftMind ? 'mind' : 'passed';
}

/** Keeping the recommended part, where that makes the finding milder. */
function lessCake(link: LinkState, now: Graded, say: Say): string | undefined {
  const less = recommendedInstead(link);
  if (less === undefined) return undefined;
  const shift = link.shiftTo(linkBlend(link.a, link.b, less.retainedL).srm);
  if (shift === undefined || !milder(now, standingAt(shift, link))) return undefined;
  return (
    `Keep ${say.part(less.keptL)} of the cake: the wort needs no more, and the ` +
    `difference falls to ${atMost(shift, 1)}.`
  );
}
