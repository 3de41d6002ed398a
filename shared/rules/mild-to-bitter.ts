import { linkBlend } from './linkBlend.ts';
import type { LinkState } from './linkState.ts';
import { missingForBlend, missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { milder, recommendedInstead, type Graded } from './remedies.ts';
import { toHundredth } from './rounding.ts';
import { atMost, type Say } from './say.ts';

interface Detail {
  ibuA: number;
  ibuB: number;
  /** What the retained beer adds to B's bitterness, IBU; negative where it takes some. */
  shift: number;
}

/** A is bitterer than B and one might taste it; or the retained beer alone moves B far. */
export const mildToBitter: Rule<Detail> = {
  id: 'mild-to-bitter',

  judge(link) {
    const { a, b, rules } = link;
    if (link.kept.retainedL === 0) return PASSED;
    if (a.ibu === undefined || b.ibu === undefined)
      return unchecked(together(missingOf(a, 'ibu'), missingOf(b, 'ibu')));
    const ibuA = toHundredth(a.ibu);
    const ibuB = toHundredth(b.ibu);
    const gap = toHundredth(ibuA - ibuB);
    // B never moves by more than the gap, so a small gap decides without any volume.
    if (gap === 0) return PASSED;
    if (
      gap < rules.bitterGapMind &&
      gap < rules.bitterGapHold &&
      Math.abs(gap) < rules.bitterShiftAlone
    )
      return PASSED;
    const shift = shiftTo(link.blend.ibu, ibuB);
    if (shift === undefined) return unchecked(missingForBlend(link));
    const standing = standingAt(shift, gap, link);
    if (standing === 'passed') return PASSED;
    return (standing === 'hold' ? hold : mind)({ ibuA, ibuB, shift });
  },

  describe({ standing, detail }, link, say) {
    const { ibuA, ibuB, shift } = detail;
    const { a, b, A } = namesOf(link);
    const down = shift < 0;
    return {
      title: down ? 'Bitterness washed out' : 'Bitter before mild',
      because:
        `${A} has ${say.bitterness(ibuA)} and ${b} ${say.bitterness(ibuB)}: the beer in the cake ` +
        `${down ? 'takes' : 'adds'} ${say.bitterness(toHundredth(Math.abs(shift)))}.`,
      do: lessCake(link, standing, detail, say) ?? otherwise(down, a, b),
      measures: measures(standing, detail, link),
      basis:
        'Order: common practice. Bitterness: differences are noticed near 6 IBU ' +
        '(Mosher 2009, at second hand).',
    };
  },
};

const otherwise = (down: boolean, a: string, b: string): string =>
  down
    ? `Pour off the beer above the cake and keep less of it, or give ${b} fresh yeast.`
    : `Brew ${b} before ${a}, or give it fresh yeast.`;

const shiftTo = (blended: number | undefined, planned: number): number | undefined =>
  blended === undefined ? undefined : toHundredth(toHundredth(blended) - planned);

function standingAt(shift: number, gap: number, { rules }: LinkState): Graded {
  const moved = Math.abs(shift);
  if (moved === 0) return 'passed';
  if (moved >= rules.bitterShiftAlone) return 'hold';
  if (gap >= rules.bitterGapHold && moved >= rules.bitterShiftHold) return 'hold';
  return gap >= rules.bitterGapMind && moved >= rules.bitterShiftMind ? 'mind' : 'passed';
}

function measures(standing: Graded, { ibuA, ibuB, shift }: Detail, { rules }: LinkState) {
  const alone = Math.abs(shift) >= rules.bitterShiftAlone;
  const held = standing === 'hold';
  const gapLimit = held ? rules.bitterGapHold : rules.bitterGapMind;
  const shiftLimit = held ? rules.bitterShiftHold : rules.bitterShiftMind;
  return [
    measure('Bitterness of the earlier beer', ibuA, 'IBU', alone ? null : ibuB + gapLimit),
    measure('Bitterness of the new beer', ibuB, 'IBU'),
    measure('Bitterness shift', shift, 'IBU', alone ? rules.bitterShiftAlone : shiftLimit),
  ];
}

/** Keeping the recommended part, where that makes the finding milder. */
function lessCake(
  link: LinkState,
  now: Graded,
  { ibuA, ibuB }: Detail,
  say: Say,
): string | undefined {
  const less = recommendedInstead(link);
  if (less === undefined) return undefined;
  const shift = shiftTo(linkBlend(link.a, link.b, less.retainedL).ibu, ibuB);
  if (shift === undefined || !milder(now, standingAt(shift, toHundredth(ibuA - ibuB), link)))
    return undefined;
  return (
    `Keep ${say.part(less.keptL)} of the cake: the wort needs no more, and the shift ` +
    `falls to ${atMost(Math.abs(shift), 1)} IBU.`
  );
}
