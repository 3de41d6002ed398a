import { CakeRun } from '../../components/drawn/CakeRun.tsx';
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

/** Height of a beer with the way to the next, so that the cake meets the next vessel. */
const STEP = 176;

/** The example on a phone: the cake runs down the page. */
export function ExampleColumn() {
  return (
    <ol className="mt-4 px-10 max-tablet:px-5">
      {EXAMPLE_BEERS.map((beer, index) => (
        <Step key={beer.facts.id} beer={beer} next={EXAMPLE_LINKS[index]} />
      ))}
    </ol>
  );
}

function Step({ beer, next }: { beer: ExampleBeer; next: ExampleLink | undefined }) {
  return (
    <li className="relative" style={{ minHeight: next ? STEP : 130 }}>
      {next && (
        <div className="absolute top-[84px] left-[30px]">
          <CakeRun height={STEP - 60} verdict={next.verdict} hops={next.hops} />
        </div>
      )}
      <div className="relative flex gap-4">
        <div className="flex w-[84px] shrink-0 flex-col items-center gap-2">
          <Vessel
            shape="bucket"
            srm={beer.facts.srm}
            fill={beer.fill}
            cake={beer.cake}
            stage={beer.pencilled ? 'pencilled' : 'fermenting'}
            width={60}
          />
          <DateTag day={beer.facts.brewOn} large />
        </div>
        <div className="min-w-0 pt-3">
          <ExampleFacts beer={beer} column />
          {next && (
            <div className="mt-6 flex flex-wrap items-center gap-x-3 gap-y-1">
              <VerdictPill verdict={next.verdict} large />
              <span className="text-body text-ink2">{next.short}</span>
            </div>
          )}
        </div>
      </div>
    </li>
  );
}
