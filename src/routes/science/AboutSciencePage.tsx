import { inherit, NOTHING_INHERITED } from '#shared/chain/inherit.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import { useTitle } from '../../app/useTitle.ts';
import { useUnits } from '../../app/useUnits.ts';
import {
  EXAMPLE_BEERS,
  EXAMPLE_POUR,
  EXAMPLE_VESSEL_L,
  EXAMPLE_YEAST,
} from '../public/exampleChain.ts';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { Science, type Choice } from './Science.tsx';
import { SCIENCE_LEAD } from './lead.ts';

/** The links of the front page's chain. */
const EXAMPLES: readonly Choice[] = EXAMPLE_BEERS.flatMap(({ facts: later }, at) => {
  const before = EXAMPLE_BEERS.slice(0, at).map(({ facts }) => facts);
  const earlier = before.at(-1);
  if (!earlier) return [];
  const input = {
    earlier,
    later,
    pour: EXAMPLE_POUR,
    yeast: EXAMPLE_YEAST,
    vessel: { capacityL: EXAMPLE_VESSEL_L, blowOff: false },
    generation: at + 1,
    inherited: before.reduce(inherit, NOTHING_INHERITED),
    rules: DEFAULT_HOUSE_RULES,
  };
  return [{ id: later.id, earlier: earlier.name, later: later.name, input }];
});

/** The science for whoever reads it without signing in, with an example's figures. */
export function AboutSciencePage() {
  useTitle('The science');
  const units = useUnits();
  return (
    <>
      <PublicHeader />
      <main
        id="main"
        className="mx-auto max-w-[1180px] px-14 pt-6 pb-20 outline-none max-tablet:px-5"
      >
        <h1 className="text-h0 tracking-[-.03em] outline-none max-tablet:text-[2.25rem]">
          The science
        </h1>
        <p className="mt-3 max-w-2xl text-lead text-ink2">{SCIENCE_LEAD}</p>
        <Science choices={EXAMPLES} units={units} without="" />
      </main>
    </>
  );
}
