import { describe, expect, it } from 'vitest';
import { checkLink } from '#shared/chain/checkLink.ts';
import { inherit, NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import {
  EXAMPLE_BEERS,
  EXAMPLE_LINKS,
  EXAMPLE_POUR,
  EXAMPLE_VESSEL_L,
  EXAMPLE_YEAST,
} from '../../../src/routes/public/exampleChain.ts';

/** The front page tells verdicts without the engine; here the engine is asked. */
describe('the chain on the front page', () => {
  it('has a link between each two beers', () => {
    expect(EXAMPLE_LINKS).toHaveLength(EXAMPLE_BEERS.length - 1);
  });

  it.each(EXAMPLE_LINKS.map((link, index) => ({ ...link, index })))(
    'is $verdict at link $index, as the checks say',
    ({ verdict, index }) => {
      const beers = EXAMPLE_BEERS.map((beer) => beer.facts);
      const [earlier, later] = [beers[index], beers[index + 1]];
      if (!earlier || !later) throw new Error('The link has no beers');
      const inherited = beers.slice(0, index + 1).reduce(inherit, NOTHING_INHERITED);
      const answer = checkLink({
        earlier,
        later,
        pour: EXAMPLE_POUR,
        yeast: EXAMPLE_YEAST,
        vessel: { capacityL: EXAMPLE_VESSEL_L, blowOff: false },
        generation: index + 2,
        inherited,
        rules: DEFAULT_HOUSE_RULES,
      });
      expect({ verdict: answer.verdict, unchecked: answer.unchecked }).toEqual({
        verdict,
        unchecked: [],
      });
    },
  );
});
