import { use } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { useBatchPatch } from '../../../api/batches.ts';
import { useMove } from '../../../api/moves.ts';
import { newId } from '../../../app/newId.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { PourViewOf } from '../pourView.ts';
import type { Way } from './ways.ts';

/** Carries a way out: the run is left, then the batches move, or their days do. */
export function useTakeWay(batch: Batch): (way: Way) => Promise<void> {
  const { slug, index } = useBoardView();
  const pour = use(PourViewOf);
  const move = useMove();
  const patch = useBatchPatch(slug);
  return async (way) => {
    if (pour?.run.state === 'open' && pour.run.batchId === batch.id)
      await pour.send({ kind: 'leave', body: { runId: pour.run.id } });
    for (const wish of way.moves) await move({ ...wish, id: newId() });
    for (const { batchId, brewOn } of way.days) {
      const version = index.batch(batchId)?.version;
      if (version !== undefined)
        await patch.mutateAsync({ id: batchId, version, patch: { brewOn } });
    }
  };
}
