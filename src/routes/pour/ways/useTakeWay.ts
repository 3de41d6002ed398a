import { use } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { useBatchPatch } from '../../../api/batches.ts';
import { sentenceOf } from '../../../api/errors.ts';
import { useMove } from '../../../api/moves.ts';
import { newId } from '../../../app/newId.ts';
import { say } from '../../../components/ui/Toast.tsx';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { PourViewOf } from '../pourView.ts';
import type { Way } from './ways.ts';

/**
 * Carries a way out: the run is left, since nothing moves under a pour in hand; then the batches
 * move, or their days do.
 */
export function useTakeWay(batch: Batch): (way: Way) => Promise<void> {
  const { slug, index } = useBoardView();
  const pour = use(PourViewOf);
  const move = useMove();
  const patch = useBatchPatch(slug);
  const change = async (way: Way) => {
    for (const wish of way.moves) await move({ ...wish, id: newId() });
    for (const { batchId, brewOn } of way.days) {
      const version = index.batch(batchId)?.version;
      if (version !== undefined)
        await patch.mutateAsync({ id: batchId, version, patch: { brewOn } });
    }
  };
  return async (way) => {
    if (pour?.run.state !== 'open' || pour.run.batchId !== batch.id) return change(way);
    await pour.send({ kind: 'leave', body: { runId: pour.run.id } });
    // The dialog goes with the run: what is refused from here on is told wherever one is then.
    await change(way).catch((error: unknown) =>
      say(`The pour is left, but this was not done. ${sentenceOf(error)}`),
    );
  };
}
