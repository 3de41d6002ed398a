import { useMemo, useState } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { pullChain } from '#shared/chain/dates.ts';
import { formatDay } from '#shared/units/day.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { usePullChain } from '../../../api/chains.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';

/** Dates behind the pour that no longer follow the cake: asked, not sprung. */
export function LaterDates({ batch }: { batch: Batch }) {
  const { board, index, slug } = useBoardView();
  const [kept, setKept] = useState(false);
  const pull = usePullChain(slug);
  const shifted = useMemo(
    () => pullChain(board, batch.chainId ?? '').shifted,
    [board, batch.chainId],
  );
  if (shifted.length === 0 || kept) return null;
  return (
    <section className="mt-6">
      <h3 className="text-h3">Dates behind it</h3>
      <p className="mt-1 text-ink2">
        With this brew day the yeast is taken on other days than planned. The dates can follow it.
      </p>
      <ul className="mt-2 grid gap-1 text-touch">
        {shifted.map(({ batchId, from, to }) => (
          <li key={batchId}>
            <b>{index.batch(batchId)?.name}</b>: {from ? formatDay(from) : 'no date'} to{' '}
            {to ? formatDay(to) : 'no date'}
          </li>
        ))}
      </ul>
      <div className="mt-3 flex flex-wrap gap-2.5">
        <Button
          size="large"
          disabled={pull.isPending}
          onClick={() => batch.chainId !== null && pull.mutate(batch.chainId)}
        >
          Pull the dates
        </Button>
        <Button size="large" look="quiet" onClick={() => setKept(true)}>
          Keep my dates
        </Button>
      </div>
      {pull.error && (
        <Notice kind="hold" alert className="mt-3">
          {sentenceOf(pull.error)}
        </Notice>
      )}
    </section>
  );
}
