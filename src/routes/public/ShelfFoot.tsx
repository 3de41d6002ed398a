import { CakeBand } from '../../components/drawn/CakeBand.tsx';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { EXAMPLE_BEERS } from './exampleChain.ts';

/** The first beers of the example on a shelf at the foot of a page. Decorates nothing but tells
 * what the page is for; hidden from screen readers, which have the words. */
export function ShelfFoot() {
  return (
    <div aria-hidden="true" className="relative mt-auto h-[136px] shrink-0 overflow-hidden">
      <div className="absolute inset-x-0 bottom-7 h-2.5 shelf-line" />
      <div className="absolute bottom-[37px] left-1/2 flex w-[346px] -translate-x-1/2 justify-between px-2.5">
        <div className="absolute bottom-0 left-9 w-[100vw]">
          <CakeBand width={1600} verdict="pour" />
        </div>
        {EXAMPLE_BEERS.slice(0, 3).map((beer) => (
          <div key={beer.facts.id} className="relative">
            <Vessel
              shape="bucket"
              srm={beer.facts.srm}
              fill={beer.fill}
              cake={beer.cake}
              stage="fermenting"
              width={54}
            />
          </div>
        ))}
      </div>
    </div>
  );
}
