import { points } from '../units/gravity.ts';
import type { Lineage } from './linkState.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { SG_15_PLATO, SG_18_PLATO } from './rounding.ts';

interface Detail {
  generation: number;
  limit: number;
}

/** B's yeast has been used more often than it should, the less so after a strong beer. */
export const generationRule = {
  id: 'generation',

  judge(link: Lineage) {
    const { generation, inherited, rules } = link;
    if (generation === undefined) return unchecked(['firstGeneration']);
    const limit = limitAfter(inherited.strongestOg ?? 1, link);
    if (generation > limit + rules.holdAfter) return hold({ generation, limit });
    if (generation > limit) return mind({ generation, limit });
    // A beer of unknown gravity may have been a strong one.
    return inherited.ogUnknown && generation > limitAfter(SG_18_PLATO, link)
      ? unchecked(['og'])
      : PASSED;
  },

  describe({ standing, detail: { generation, limit } }, link, say) {
    const { b, B } = namesOf(link);
    const strongest = link.inherited.strongestOg;
    const lowered = strongest !== undefined && limit < ownLimit(link);
    return {
      title: 'Late generation',
      because:
        `${B} would be generation ${generation} of this yeast; the limit is ${limit}` +
        `${lowered ? ` after a beer of ${say.gravity(strongest)}` : ''}.`,
      do: `Start a fresh pack before ${b}.`,
      measures: [
        measure(
          'Generation',
          generation,
          '',
          standing === 'hold' ? limit + link.rules.holdAfter : limit,
        ),
      ],
      basis:
        'After strong beers: at most 5 generations at 15 °P and 4 at 18 °P ' +
        '(EEJET 2021, doi 10.15587/1729-4061.2021.248126); 7 to 10 otherwise is common practice.',
    };
  },
} satisfies Rule<Detail>;

const ownLimit = ({ yeast, rules }: Lineage): number => yeast.generationLimit ?? rules.generations;

/** The highest generation after a beer of this original gravity. */
function limitAfter(og: number, link: Lineage): number {
  const reached = points(og);
  let limit = ownLimit(link);
  if (reached >= points(SG_15_PLATO)) limit = Math.min(limit, link.rules.generationsFrom15P);
  if (reached >= points(SG_18_PLATO)) limit = Math.min(limit, link.rules.generationsFrom18P);
  return limit;
}
