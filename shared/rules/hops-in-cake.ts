import type { DryHop } from './facts.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { withoutNoise } from './rounding.ts';

interface Detail {
  /** Dry hops on the cake, g/L, bagged ones by their share. */
  load: number;
  /** B is known to take no dry hops, and that makes it a hold. */
  plain: boolean;
}

/** Dry hops went onto the cake before the yeast was taken. */
export const hopsInCake: Rule<Detail> = {
  id: 'hops-in-cake',

  judge({ a, b, rules }) {
    if (a.dryHops === undefined) return unchecked(['dryHop']);
    const load = hopLoad(a.dryHops, rules.baggedShare);
    if (load >= rules.hopsHold) return hold({ load, plain: false });
    const plain = b.dryHops?.every((hop) => hop.gramsPerLitre === 0) ?? false;
    if (load >= rules.hopsHoldPlain && plain) return hold({ load, plain });
    return load > rules.hopsMind ? mind({ load, plain: false }) : PASSED;
  },

  describe({ standing, detail: { load, plain } }, link, say) {
    const { a, b, A } = namesOf(link);
    const { rules } = link;
    const bagged = onCake(link.a.dryHops ?? []).some((hop) => hop.contained === 'bagged');
    const counted = bagged ? `, bagged hops counted at ${say.percent(rules.baggedShare)}` : '';
    const heldAt = plain ? rules.hopsHoldPlain : rules.hopsHold;
    return {
      title: 'Hops in the cake',
      because:
        `${A} takes ${say.rate(load)} of dry hops before its yeast is taken${counted}` +
        `${plain ? `, and ${b} takes none` : ''}.`,
      do: `Take the yeast of ${a} before the dry hops go in.`,
      measures: [
        measure('Dry hops on the cake', load, 'g/L', standing === 'hold' ? heldAt : rules.hopsMind),
      ],
      basis:
        'Harvesting before dry hopping: advice of a yeast maker; the limits are common practice.',
    };
  },
};

export const onCake = (hops: readonly DryHop[]): DryHop[] =>
  hops.filter((hop) => hop.timing === 'on-cake' && hop.gramsPerLitre > 0);

/** Dry hops that reached the cake, g/L; bagged ones count a share. */
export function hopLoad(hops: readonly DryHop[], baggedShare: number): number {
  let load = 0;
  for (const hop of hops)
    if (hop.timing === 'on-cake')
      load += hop.gramsPerLitre * (hop.contained === 'bagged' ? baggedShare : 1);
  return withoutNoise(load);
}
