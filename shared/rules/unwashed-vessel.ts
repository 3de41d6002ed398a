import type { VesselDays } from './linkState.ts';
import { namesOf } from './names.ts';
import { measure, mind, NOWHERE, PASSED, type Rule } from './outcome.ts';

interface Detail {
  beers: number;
}

/** Several beers in one vessel without a cleaning. Stands nowhere where none is recorded. */
export const unwashedVessel = {
  id: 'unwashed-vessel',

  judge({ pour: { beersSinceCleaning: beers }, rules }: VesselDays) {
    if (beers === undefined) return NOWHERE;
    return beers >= rules.beersSinceCleaning ? mind({ beers }) : PASSED;
  },

  describe({ detail: { beers } }, link) {
    const { b, B } = namesOf(link);
    return {
      title: 'Unwashed vessel',
      because: `${B} would be beer number ${beers} in this vessel since it was cleaned.`,
      do: `Take the cake out and clean the vessel before ${b}.`,
      measures: [measure('Beers since cleaning', beers, 'beers', link.rules.beersSinceCleaning)],
      basis: 'Common practice',
    };
  },
} satisfies Rule<Detail>;
