import type { Lineage } from './linkState.ts';
import { namesOf } from './names.ts';
import type { Rule } from './outcome.ts';
import { listed } from './say.ts';
import { undeclared, type Undeclared } from './undeclared.ts';
import { ALLERGENS, type Allergen } from './vocabulary.ts';
import { ALLERGEN_WORDS, capital } from './words.ts';

/** An allergen of an earlier beer is in this one, whatever the dilution. Never softened. */
export const allergen = {
  id: 'allergen',

  judge({ inherited, b }: Lineage) {
    return undeclared(
      inherited.allergens,
      inherited.allergensUnknown ?? false,
      b.allergens,
      ALLERGENS,
      'allergens',
    );
  },

  describe({ detail: { left } }, link) {
    const { b } = namesOf(link);
    const allergens = listed(left.map((one) => ALLERGEN_WORDS[one]));
    return {
      title: 'Undeclared allergen',
      because: `${capital(allergens)} went into an earlier beer on this yeast, and ${b} does not declare ${left.length > 1 ? 'them' : 'it'}; no dilution removes an allergen.`,
      do: `Declare ${allergens} on ${b}, or brew it on fresh yeast.`,
      measures: [],
      basis: 'Regulation (EU) No 1169/2011, Annex II; labelling law is local.',
    };
  },
} satisfies Rule<Undeclared<Allergen>>;
