import { CakeBand } from '../../components/drawn/CakeBand.tsx';
import { DateTag } from '../../components/drawn/DateTag.tsx';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { VerdictPill } from '../../components/drawn/VerdictPill.tsx';
import {
  EXAMPLE_BEERS,
  EXAMPLE_LINKS,
  type ExampleBeer,
  type ExampleLink,
} from '../public/exampleChain.ts';
import { ExampleFacts } from './ExampleFacts.tsx';

/** Wider than any cell: the band is cut where the next vessel's middle is. */
const BAND = 420;

/** The example on one shelf across the page. */
export function ExampleShelf() {
  return (
    <div className="relative mt-5 overflow-x-clip pb-32 pl-14">
      <div className="absolute inset-x-0 bottom-28 h-4 shelf-line" />
      <ol className="grid max-w-[1400px] grid-cols-4">
        {EXAMPLE_BEERS.map((beer, index) => (
          <Cell key={beer.facts.id} beer={beer} next={EXAMPLE_LINKS[index]} />
        ))}
      </ol>
    </div>
  );
}

function Cell({ beer, next }: { beer: ExampleBeer; next: ExampleLink | undefined }) {
  return (
    <li className="relative flex items-end gap-2">
      {next && (
        <div className="absolute bottom-0 left-[75px] w-full overflow-x-clip">
          <CakeBand width={BAND} verdict={next.verdict} hops={next.hops} />
        </div>
      )}
      <div className="relative z-[1] w-[150px] shrink-0">
        <Vessel
          shape="bucket"
          srm={beer.facts.srm}
          fill={beer.fill}
          cake={beer.cake}
          stage={beer.pencilled ? 'pencilled' : 'fermenting'}
          width={150}
        />
        <div className="absolute top-full left-1/2 -translate-x-1/2 pt-6">
          <DateTag day={beer.facts.brewOn} large />
        </div>
      </div>
      <div className="relative z-[1] min-w-0 pb-11">
        <ExampleFacts beer={beer} />
      </div>
      {next && (
        <div className="absolute top-full left-[158px] w-44 pt-7">
          <VerdictPill verdict={next.verdict} large />
          <p className="mt-1 text-body leading-tight text-ink2">{next.reason}</p>
        </div>
      )}
    </li>
  );
}
