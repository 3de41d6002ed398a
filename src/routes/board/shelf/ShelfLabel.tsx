import type { Chain } from '#shared/api/chain.ts';
import { formatMoney } from '#shared/units/money.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { GenerationMarks } from '../../../components/drawn/GenerationMarks.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { generationLine, yeastLine } from '../view/words.ts';
import { Descent } from '../../descent/Descent.tsx';
import { ChainMenu } from './ChainMenu.tsx';
import { ChainName, UnreadMark } from './ChainName.tsx';

/** Name of the chain, its yeast, how far the yeast has come and what a batch costs. */
export function ShelfLabel({ chain, headingId }: { chain: Chain; headingId: string }) {
  const { board, index, judged, units, can } = useBoardView();
  const yeast = index.yeasts.get(chain.yeastId);
  const verdicts = judged.chains.get(chain.id);
  return (
    <div className="relative z-10 pt-3 pr-2">
      <h2 id={headingId} title={chain.name} className="line-clamp-3 text-shelf font-[680]">
        <ChainName chain={chain} />
      </h2>
      <UnreadMark chain={chain} />
      {yeast && (
        <p className="mt-[3px] text-small text-ink2">
          {yeast.name !== chain.name && <span className="line-clamp-2">{yeast.name}</span>}
          {unbroken(yeastLine(yeast, units))}
        </p>
      )}
      <Descent chain={chain} />
      {verdicts && (
        <div className="mt-2 text-small leading-[1.35] text-ink2">
          <GenerationMarks generations={verdicts.generations} limit={verdicts.generationLimit} />
          <p className="mt-1">{generationLine(verdicts.generations, verdicts.generationLimit)}</p>
          {verdicts.costPerBatch !== null && (
            <p className="text-body font-bold text-ink">
              {formatMoney(verdicts.costPerBatch, board.brewery.currency)} a batch
            </p>
          )}
        </div>
      )}
      {can.editChains && (
        <div className="mt-1 -ml-1.5 print:hidden">
          <ChainMenu chain={chain} />
        </div>
      )}
    </div>
  );
}
