import type { Batch } from '#shared/api/batch.ts';
import { LiftHandle } from '../lift/LiftHandle.tsx';
import { MoveMenu } from '../lift/MoveMenu.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { BatchMenu } from './BatchMenu.tsx';

/** Handle, places and all else that can be done to a batch; nothing for those who only read. */
export function BatchActions({ batch }: { batch: Batch }) {
  const { can } = useBoardView();
  if (!can.moveBatches && !can.editBatches) return null;
  return (
    <div className="mb-0.5 -ml-1.5 flex items-center print:hidden">
      {can.moveBatches && batch.stage === 'pencilled' && (
        <>
          <LiftHandle batchId={batch.id} />
          <MoveMenu batchId={batch.id} />
        </>
      )}
      {can.editBatches && <BatchMenu batch={batch} />}
    </div>
  );
}
