import type { Batch } from '#shared/api/batch.ts';
import { formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { Vessel } from '../../components/drawn/Vessel.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';

/** The vessel with its cake and no beer, what goes onto what, and the day. */
export function PourHead({ batch, cakeOf }: { batch: Batch; cakeOf: Batch | null }) {
  const { board, index, judged } = useBoardView();
  const { path } = useBrewery();
  const chain = index.chain(batch.chainId ?? '');
  const vessel = index.vessels.get(batch.vesselId ?? chain?.vesselId ?? '');
  const yeast = index.yeasts.get(chain?.yeastId ?? '');
  const generation = judged.generation.get(batch.id);
  const isPoured = batch.stage !== 'pencilled';
  const facts = [
    formatDay(isPoured ? (batch.brewOn ?? board.today) : board.today),
    ...(generation === undefined ? [] : [`generation ${generation}`]),
    ...(yeast ? [yeast.name] : []),
  ];
  return (
    <header className="on-bar bg-bar text-on-bar">
      <div className="mx-auto flex max-w-5xl items-center gap-4 px-7 py-4 max-tablet:px-[18px]">
        <span className="rounded-lg bg-on-bar/90 p-1.5 dark:bg-transparent">
          <Vessel
            shape={vessel?.shape ?? 'bucket'}
            srm={isPoured ? batch.srm : null}
            fill={isPoured ? 0.72 : 0}
            cake={cakeOf ? 0.12 : null}
            stage={isPoured ? batch.stage : 'fermenting'}
            width={38}
          />
        </span>
        <div className="min-w-0">
          <h1 className="font-display text-h2 leading-tight font-[650] tracking-[-.01em]">
            {cakeOf ? `${batch.name} onto ${cakeOf.name}’s cake` : `${batch.name} onto fresh yeast`}
          </h1>
          <p className="mt-0.5 text-body text-on-bar2">{facts.join(' · ')}</p>
          <p className="text-small max-tablet:hidden">
            <TextLink to={path()} className="text-on-bar2">
              Back to the board
            </TextLink>
          </p>
        </div>
      </div>
    </header>
  );
}
