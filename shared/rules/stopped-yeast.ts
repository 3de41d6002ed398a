import { namesOf } from './names.ts';
import { hold, PASSED, unchecked, type Rule } from './outcome.ts';

/** Metabisulphite or sorbate went in before the yeast was taken: it will not work again. */
export const stoppedYeast: Rule<null> = {
  id: 'stopped-yeast',

  judge({ a }) {
    if (a.additions === undefined) return unchecked(['additions']);
    return a.additions.some((one) => one.what === 'stabiliser' && one.timing === 'on-cake')
      ? hold(null)
      : PASSED;
  },

  describe(_found, link) {
    const { a, b } = namesOf(link);
    return {
      title: 'Stabilised yeast',
      because: `Metabisulphite or sorbate goes into ${a} before its yeast is taken, which stops the yeast for ${b} too.`,
      do: `Take the yeast of ${a} before the stabiliser goes in, or give ${b} fresh yeast.`,
      measures: [],
      basis: 'Common practice',
    };
  },
};
