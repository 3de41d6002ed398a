import type { Batch } from '#shared/api/batch.ts';
import { unbroken } from '../../../app/unbroken.ts';
import { StageMark } from '../../../components/drawn/StageMark.tsx';
import { BatchActions } from '../batch/BatchActions.tsx';
import { BatchName } from '../batch/BatchName.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { beerFacts, stageLine } from '../view/words.ts';

/** Name, style, figures and stage beside a vessel, with what can be done to the batch. */
export function BatchText({ batch }: { batch: Batch }) {
  const { units, board } = useBoardView();
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <>
      <BatchActions batch={batch} />
      <h3 className="text-h3 leading-[1.12] font-[680]">
        <BatchName batch={batch} className="line-clamp-2 min-h-6" />
      </h3>
      {batch.style && (
        <p title={batch.style} className="truncate text-small leading-[1.25] text-ink2">
          {batch.style}
        </p>
      )}
      <p className="mt-0.5 text-[0.8125rem] leading-[1.3] tracking-[-0.015em] text-ink2">
        <b className="text-ink">{gravity && unbroken(gravity)}</b> {rest.map(unbroken).join(' ')}
      </p>
      <p className="mt-0.5 flex items-center gap-1.5 text-small whitespace-nowrap text-ink2">
        <StageMark stage={batch.stage} />
        {stageLine(batch, board.today)}
      </p>
    </>
  );
}
