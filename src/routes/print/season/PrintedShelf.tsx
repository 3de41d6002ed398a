import { useMemo } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { chainAlone } from '#shared/chain/chainAlone.ts';
import { formatMoney } from '#shared/units/money.ts';
import { format } from '#shared/units/quantity.ts';
import { allergensLine, culturesLine } from '../../../app/carriedWords.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { generationLine, yeastLine } from '../../board/view/words.ts';
import { PaperShelf } from '../PaperShelf.tsx';

/** One shelf of the season; it stays together on a page where it fits on one. */
export function PrintedShelf({ chain }: { chain: Chain }) {
  return (
    <section aria-label={chain.name} data-chain={chain.id} className="mt-5 break-inside-avoid">
      <h2 className="text-[1.4em] leading-[1.15]">{chain.name}</h2>
      <ChainLine chain={chain} />
      <PaperShelf chain={chain} />
    </section>
  );
}

/** Yeast, vessel, how far the yeast has come, what a batch costs, and what travels with the cake. */
export function ChainLine({ chain }: { chain: Chain }) {
  const { board, index, judged, units } = useBoardView();
  const carries = useMemo(() => chainAlone(board, chain.id)?.carries, [board, chain.id]);
  const yeast = index.yeasts.get(chain.yeastId);
  const vessel = index.vessels.get(chain.vesselId ?? '');
  const verdicts = judged.chains.get(chain.id);
  const cost = verdicts?.costPerBatch ?? null;
  const words = [
    ...(yeast ? [`${yeast.name}, ${yeastLine(yeast, units)}`] : []),
    ...(vessel ? [`${vessel.name}, ${format('volume', vessel.capacityL, units)}`] : []),
    ...(verdicts ? [generationLine(verdicts.generations, verdicts.generationLimit)] : []),
    ...(cost === null ? [] : [`${formatMoney(cost, board.brewery.currency)} of yeast a batch`]),
  ];
  return (
    <>
      <p>{words.join(' · ')}</p>
      {carries && (
        <p>
          Allergens: {allergensLine(carries)} Live cultures and enzymes beside the yeast:{' '}
          {culturesLine(carries)}
        </p>
      )}
    </>
  );
}
