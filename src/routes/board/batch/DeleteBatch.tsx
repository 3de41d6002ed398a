import type { Batch } from '#shared/api/batch.ts';
import { useBatchDelete } from '../../../api/batches.ts';
import { ConfirmDialog } from '../../../components/ui/ConfirmDialog.tsx';
import { useBoardView } from '../view/BoardView.tsx';

export function DeleteBatch({ batch, onClose }: { batch: Batch; onClose: () => void }) {
  const { slug } = useBoardView();
  const remove = useBatchDelete(slug);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Delete ${batch.name}?`}
      action="Delete it"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate({ id: batch.id, version: batch.version }, { onSuccess: onClose })
      }
    >
      <p>
        All that was written down of it goes. A batch that was brewed and went wrong is better
        scrapped: it then stays on the record.
      </p>
    </ConfirmDialog>
  );
}
