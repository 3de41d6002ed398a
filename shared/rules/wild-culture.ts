import type { Lineage } from './linkState.ts';
import { namesOf } from './names.ts';
import type { Rule } from './outcome.ts';
import { listed } from './say.ts';
import { undeclared, type Undeclared } from './undeclared.ts';
import { CULTURES, type Culture } from './vocabulary.ts';
import { capital, CULTURE_WORDS } from './words.ts';

/** A culture or enzyme of an earlier beer lives on in the cake. Never softened. */
export const wildCulture = {
  id: 'wild-culture',

  judge({ inherited, b }: Lineage) {
    return undeclared(
      inherited.cultures,
      inherited.culturesUnknown ?? false,
      b.cultures,
      CULTURES,
      'cultures',
    );
  },

  describe({ detail: { left } }, link) {
    const { b } = namesOf(link);
    const cultures = listed(left.map((one) => CULTURE_WORDS[one]));
    return {
      title: 'Wild culture in the cake',
      because: `${capital(cultures)} came into this yeast with an earlier beer, and ${b} does not declare ${left.length > 1 ? 'them' : 'it'}.`,
      do: `Declare ${cultures} on ${b} if it is meant to have ${left.length > 1 ? 'them' : 'it'}, or brew it on fresh yeast; packaged, such a beer can over-carbonate and burst.`,
      measures: [],
      basis:
        'Zero tolerance for diastatic yeast: Meier-Dörnberg et al. 2017, at second hand; the rest is common practice.',
    };
  },
} satisfies Rule<Undeclared<Culture>>;
