import { missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { toTenth } from './rounding.ts';

interface Detail {
  ogA: number;
  ogB: number;
  jump: number;
  strong: boolean;
  limit: number;
}

/** B is far stronger than A. */
export const gravityJump: Rule<Detail> = {
  id: 'gravity-jump',

  judge({ a, b, pointsA, pointsB, rules }) {
    if (a.og === undefined || b.og === undefined || pointsA === undefined || pointsB === undefined)
      return unchecked(together(missingOf(a, 'og'), missingOf(b, 'og')));
    const jump = toTenth(pointsB - pointsA);
    const detail = { ogA: a.og, ogB: b.og, jump, strong: jump > rules.jumpStrong };
    if (rules.jumpHold !== null && jump > rules.jumpHold)
      return hold({ ...detail, limit: rules.jumpHold });
    if (detail.strong)
      return mind({ ...detail, limit: Math.min(rules.jumpStrong, rules.jumpMind) });
    return jump > rules.jumpMind ? mind({ ...detail, limit: rules.jumpMind }) : PASSED;
  },

  describe({ detail: { ogA, ogB, jump, strong, limit } }, link, say) {
    const { a, b, B } = namesOf(link);
    const step = 1 + (toTenth((ogB - 1) * 1000) - Math.min(link.rules.jumpMind, limit)) / 1000;
    return {
      title: strong ? 'Very big gravity jump' : 'Big gravity jump',
      because:
        `${B} at ${say.gravity(ogB)} is ${say.gravityGap(ogB, ogA)} above ${a} at ` +
        `${say.gravity(ogA)}${strong ? ': the cells meet a shock that may kill or stall many of them' : ''}.`,
      do: `Put a beer of ${say.gravity(step)} or more between the two, and give ${b} oxygen and nutrient.`,
      measures: [measure('Step in original gravity', jump, 'points', limit)],
      basis: 'Common practice; no published limit exists.',
    };
  },
};
