import type { LinkState } from './linkState.ts';
import { missingForCake, missingForSurvival, missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { downToTenth } from './remedies.ts';
import { toHundredth } from './rounding.ts';
import { atMost, type Say } from './say.ts';

interface Detail {
  ratio: number;
  limit: number;
  why: 'none' | 'little' | 'much';
}

/** The kept cells against what the wort needs. */
export const pitchAmount: Rule<Detail> = {
  id: 'pitch-amount',

  judge({ a, b, pour, yeast, kept, rules }) {
    if (kept.share === 0) return hold({ ratio: 0, limit: rules.pitchHold, why: 'none' });
    // Waiting only loses cells: where even a fresh cake falls short, the wait need not be known.
    const atMostRatio = kept.ratio ?? kept.ratioAtMost;
    if (atMostRatio !== undefined) {
      const short = { ratio: atMostRatio, why: 'little' } as const;
      if (atMostRatio < rules.pitchHold) return hold({ ...short, limit: rules.pitchHold });
      if (atMostRatio < rules.pitchMind) return mind({ ...short, limit: rules.pitchMind });
    }
    if (kept.ratio === undefined)
      return unchecked(
        together(missingForCake(a), missingOf(b, 'volumeL', 'og'), missingForSurvival(a, b, pour)),
      );
    if (kept.ratio < rules.characterMind || !Number.isFinite(kept.ratio)) return PASSED;
    if (yeast.character === undefined) return unchecked(['character']);
    return yeast.character
      ? mind({ ratio: kept.ratio, limit: rules.characterMind, why: 'much' })
      : PASSED;
  },

  describe({ detail }, link, say) {
    const { b } = namesOf(link);
    const { ratio, limit, why } = detail;
    const part = link.kept.keptL;
    const kept = part === undefined ? 'The cake' : `The ${say.part(part)} of cake that is kept`;
    const because = {
      none: `Nothing of the cake is kept, so ${b} would get no yeast.`,
      little: `${kept} holds about ${atMost(ratio, 2)} times the living cells that ${b} needs.`,
      much: `${kept} holds about ${atMost(ratio, 1)} times the living cells that ${b} needs, and this yeast then makes less of its character.`,
    }[why];
    return {
      title: { none: 'No cake kept', little: 'Too little yeast', much: 'Too much yeast' }[why],
      because,
      do: why === 'much' ? lessCake(link, say) : moreYeast(link, detail, say),
      measures: [measure('Kept cells', toHundredth(ratio), '× need', limit)],
      basis:
        'Need: Fix 1997. Cells in a cake: growth after White and Zainasheff 2010, uncertain by a factor of 1.8 either way.',
    };
  },
};

function lessCake(link: LinkState, say: Say): string {
  const litres = link.recommended?.litres;
  return litres === undefined
    ? 'Keep less of the cake.'
    : `Keep ${say.part(litres)} of the cake, which is enough at the low end of the estimate.`;
}

/** Keep more where there is more, else brew less. */
function moreYeast(link: LinkState, { why }: Detail, say: Say): string {
  const { b } = namesOf(link);
  const { recommended, kept, rules } = link;
  const whole = link.keeping(undefined).ratio;
  if (
    recommended !== undefined &&
    recommended.litres > (kept.keptL ?? Infinity) &&
    whole !== undefined
  )
    return whole >= rules.pitchMind || why === 'none'
      ? `Keep ${say.part(recommended.litres)} of the cake.`
      : link.pour.sharedWith
        ? 'Keep all that is left of the cake, and add fresh yeast; or give the other wort less.'
        : 'Keep the whole cake, and add fresh yeast.';
  const ratio = kept.ratio ?? kept.ratioAtMost ?? 0;
  if (why === 'none' || link.b.volumeL === undefined) return 'Keep a part of the cake.';
  const litres = downToTenth((link.b.volumeL * ratio) / rules.pitchMind);
  return `Brew at most ${say.volume(litres)} of ${b} on this cake, or pitch fresh yeast beside it.`;
}
