import type { Batch } from '#shared/api/batch.ts';
import { sentenceOf } from '../../api/errors.ts';
import { usePour } from '../../api/pour.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { PourHead } from './PourHead.tsx';
import { PourStart } from './PourStart.tsx';
import { RunningPour } from './RunningPour.tsx';

/** A pour as it stands: not begun, under way, or done. */
export function OpenedPour({ batch }: { batch: Batch }) {
  const { slug, board, index } = useBoardView();
  const before = index.predecessor(batch.id);
  const { data, error, isWaiting } = usePour(
    slug,
    batch.id,
    board.season.revision,
    before?.id ?? null,
  );
  const run = data?.run ?? null;
  const isUnderWay =
    run !== null &&
    (run.state === 'open' || batch.stage !== 'pencilled' || (isWaiting && run.state === 'poured'));
  const cakeOf = isUnderWay ? (index.batch(run.cakeBatchId ?? '') ?? null) : before;
  return (
    <main id="main" className="grow outline-none">
      <PourHead batch={batch} cakeOf={cakeOf} />
      <div className="mx-auto w-full max-w-5xl px-7 pt-3 pb-12 max-tablet:px-[18px]">
        {error && !data ? (
          <Notice kind="hold" className="mt-4">
            {sentenceOf(error)}
          </Notice>
        ) : data === undefined ? (
          <Skeleton label="Loading the pour" />
        ) : isUnderWay ? (
          <RunningPour key={run.id} run={run} batch={batch} cakeOf={cakeOf} />
        ) : (
          <PourStart batch={batch} cakeOf={cakeOf} />
        )}
      </div>
    </main>
  );
}
