import { missingForSurvival, missingForWait } from './missing.ts';
import { namesOf } from './names.ts';
import { hold, measure, mind, PASSED, unchecked, type Rule } from './outcome.ts';
import { toHundredth, toTenth } from './rounding.ts';
import { days } from './say.ts';

/** Above this a bare cake is no cold store, °C (common practice). */
const WARM_C = 12;

interface Detail {
  waitDays: number;
  c: number;
  survival: number;
  /** Held for standing warm for too many days. */
  warm: boolean;
  /** Over the hold limit, though a starter may make a mind of it. */
  over: 'mind' | 'hold';
}

/** The cake waits between the day it is taken and B's brew day. */
export const cakeWait: Rule<Detail> = {
  id: 'cake-wait',

  judge({ a, b, pour, times, rules }) {
    const { waitDays, waitC: c, survival } = times;
    if (waitDays === undefined) return unchecked(missingForWait(a, b, pour));
    if (waitDays <= 0) return PASSED;
    if (c === undefined || survival === undefined) return unchecked(missingForSurvival(a, b, pour));
    const warm = waitDays > rules.warmWaitHoldDays && toTenth(c) > WARM_C;
    const detail = { waitDays, c, survival, warm };
    if (warm || survival < rules.survivalHold)
      return (pour.starter ? mind : hold)({ ...detail, over: 'hold' });
    return survival < rules.survivalMind ? mind({ ...detail, over: 'mind' }) : PASSED;
  },

  describe({ detail: { waitDays, c, survival, warm, over } }, link, say) {
    const { a, b } = namesOf(link);
    const { rules } = link;
    const day = link.b.brewOn === undefined ? 'the brew day' : say.day(link.b.brewOn);
    return {
      title: 'Cake waits too long',
      because:
        `The cake of ${a} waits ${days(waitDays)} at ${say.temperature(c)}: about ` +
        `${say.percent(survival)} of its cells live through that.`,
      do: `Take the yeast of ${a} on ${day}, the day ${b} is brewed.`,
      measures: [
        measure(
          'Cells that outlive the wait',
          toTenth(survival * 100),
          '%',
          toHundredth(100 * (over === 'hold' ? rules.survivalHold : rules.survivalMind)),
        ),
        measure('Wait', waitDays, 'days', warm ? rules.warmWaitHoldDays : null),
        measure('Temperature of the cake', toTenth(c), '°C', warm ? WARM_C : null),
      ],
      basis:
        'Survival fitted to McCaig and Bendiak 1985 (lager slurry, up to six days; half-life ' +
        'uncertain by a factor of two or more); hygiene of a warm cake: common practice.',
    };
  },
};
