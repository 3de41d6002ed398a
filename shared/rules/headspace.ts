import { points } from '../units/gravity.ts';
import type { LinkState } from './linkState.ts';
import { missingForKept, missingOf, together } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { upToTenth } from './remedies.ts';
import { toTenth } from './rounding.ts';
import type { Say } from './say.ts';

/** From this original gravity a wort foams the more (common practice). */
const STRONG_POINTS = points(1.065);

interface Detail {
  /** Free space ÷ B's volume. */
  free: number;
  limit: number;
}

/** Room above the wort for the foam. */
export const headspace: Rule<Detail> = {
  id: 'headspace',

  judge(link) {
    const { freeShare, freeShareAtMost: atMost } = link.kept;
    const limits = mindLimits(link);
    const least = Math.min(...limits);
    if (atMost !== undefined) {
      // The cake only takes room: a vessel that is too small without it need not know it.
      const { freeHold } = link.rules;
      if (atMost < freeHold) return hold({ free: atMost, limit: freeHold });
      if (atMost < least) return mind({ free: atMost, limit: least });
    }
    return freeShare !== undefined && freeShare >= Math.max(...limits)
      ? PASSED
      : unchecked(missing(link));
  },

  describe({ standing, detail: { free, limit } }, link, say) {
    const { b, B } = namesOf(link);
    const volumeL = link.b.volumeL ?? 0;
    const capacityL = link.vessel?.capacityL ?? 0;
    const litres = free * volumeL;
    const room =
      litres < 0 ? `${say.volume(-litres)} too little` : `${say.volume(litres)} of free space`;
    return {
      title: litres < 0 ? 'Vessel too small' : 'Too little headspace',
      because:
        `${B} takes ${say.volume(volumeL)} of the ${say.volume(capacityL)} vessel, which with ` +
        `the cake leaves ${room}, ${say.percent(free)} of the batch.`,
      do: remedy(link, free, b, say),
      measures: [
        measure(
          'Free space',
          toTenth(free * 100),
          '%',
          toTenth(100 * (standing === 'hold' ? link.rules.freeHold : limit)),
        ),
      ],
      basis:
        'Common practice; a published plant left 25 % above its ales (Shardlow 1972). Never block the airlock of a full vessel.',
    };
  },
};

/** Every mind limit that what is known leaves possible. */
function mindLimits({ pointsB, vessel, rules }: LinkState): number[] {
  const plain =
    pointsB === undefined
      ? [rules.freeMind, rules.freeMindStrong]
      : [pointsB >= STRONG_POINTS ? rules.freeMindStrong : rules.freeMind];
  if (vessel?.blowOff === true) return [rules.freeBlowOff];
  return vessel?.blowOff === false ? plain : [...plain, rules.freeBlowOff];
}

function missing(link: LinkState): string[] {
  const { b, vessel, kept } = link;
  return together(
    vessel === undefined ? ['vessel'] : vessel.capacityL === undefined ? ['capacityL'] : [],
    missingOf(b, 'volumeL'),
    kept.freeShare === undefined ? missingForKept(link) : [],
    vessel?.blowOff === true ? [] : missingOf(b, 'og'),
    vessel !== undefined && vessel.blowOff === undefined ? ['blowOff'] : [],
  );
}

function remedy(link: LinkState, free: number, b: string, say: Say): string {
  const { rules, vessel } = link;
  if (vessel?.blowOff !== true && free >= rules.freeBlowOff && rules.freeBlowOff >= rules.freeHold)
    return 'Fit a blow-off tube of 25 mm or more.';
  const wanted = Math.max(...mindLimits(link));
  const volumeL = link.b.volumeL ?? 0;
  const capacityL = upToTenth((vessel?.capacityL ?? 0) + (wanted - free) * volumeL);
  return `Brew ${b} in a vessel of ${say.volume(capacityL)} or more.`;
}
