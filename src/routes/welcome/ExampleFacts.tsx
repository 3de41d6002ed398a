import { formatBare } from '#shared/units/quantity.ts';
import { METRIC } from '../../app/units.ts';
import type { ExampleBeer } from '../public/exampleChain.ts';

export function ExampleFacts({ beer, column = false }: { beer: ExampleBeer; column?: boolean }) {
  const { name, og, srm, ibu } = beer.facts;
  return (
    <div className="min-w-0">
      <h3 className="text-h2 tracking-display max-wide:text-shelf">{name}</h3>
      <p className="text-touch text-ink2">{beer.style}</p>
      <p className="mt-1 text-body text-ink2">
        <b className="text-ink">{formatBare('gravity', og, METRIC)}</b>
        {column ? ' · ' : ' '}
        {srm} SRM{column ? ' · ' : ' '}
        {ibu} IBU
      </p>
    </div>
  );
}
