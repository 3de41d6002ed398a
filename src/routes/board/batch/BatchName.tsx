import clsx from 'clsx';
import type { Batch } from '#shared/api/batch.ts';
import { useOpenPanel } from '../view/useBoardPanel.ts';

/** A batch's name; opens its panel. */
export function BatchName({ batch, className }: { batch: Batch; className?: string }) {
  const open = useOpenPanel();
  return (
    <button
      type="button"
      title={batch.name}
      onClick={() => open({ kind: 'batch', batchId: batch.id })}
      className={clsx('text-left decoration-2 underline-offset-2 hover:underline', className)}
    >
      {batch.name}
    </button>
  );
}
