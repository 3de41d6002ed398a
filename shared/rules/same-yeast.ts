import { namesOf } from './names.ts';
import { hold, mind, PASSED, type Rule } from './outcome.ts';

interface Detail {
  differs: 'kind' | 'character' | 'strain';
}

/** B asks for another yeast than the chain's. An unknown character is taken for a plain one. */
export const sameYeast: Rule<Detail> = {
  id: 'same-yeast',

  judge({ pour: { otherYeast }, yeast }) {
    if (otherYeast === undefined) return PASSED;
    if (otherYeast.kind !== yeast.kind) return hold({ differs: 'kind' });
    if (otherYeast.character || yeast.character) return hold({ differs: 'character' });
    return mind({ differs: 'strain' });
  },

  describe({ detail: { differs } }, link) {
    const { a, b, B } = namesOf(link);
    const asked = link.pour.otherYeast?.kind ?? link.yeast.kind;
    const because = {
      kind: `${B} asks for ${asked} yeast, and the cake of ${a} is ${link.yeast.kind} yeast.`,
      character: `${B} asks for another yeast, and one of the two has a character one would taste.`,
      strain: `${B} asks for another ${asked} yeast than the one in the cake of ${a}.`,
    }[differs];
    return {
      title: differs === 'kind' ? 'Another kind of yeast' : 'Another yeast',
      because,
      do: `Brew ${b} with the yeast of this chain, or move it to a chain of the yeast it asks for.`,
      measures: [],
      basis: 'Common practice',
    };
  },
};
