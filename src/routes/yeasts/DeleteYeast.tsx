import type { Yeast } from '#shared/api/yeast.ts';
import { useBoard } from '../../api/board.ts';
import { useYeastDelete } from '../../api/yeasts.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';

export interface DeleteYeastProps {
  yeast: Yeast;
  onClose: () => void;
  onDone: () => void;
}

export function DeleteYeast({ yeast, onClose, onDone }: DeleteYeastProps) {
  const { slug } = useBrewery();
  const remove = useYeastDelete(slug);
  const shelves = useBoard().chains.filter((chain) => chain.yeastId === yeast.id);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Delete ${yeast.name}?`}
      action="Delete the yeast"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate({ id: yeast.id, version: yeast.version }, { onSuccess: onDone })
      }
    >
      {shelves.length > 0 ? (
        <p>
          It lives on {shelves.map((chain) => chain.name).join(', ')}. A yeast that a shelf lives on
          cannot be deleted; delete the shelf first or give it another yeast.
        </p>
      ) : (
        <p>It goes from the list. No batch is deleted with it.</p>
      )}
    </ConfirmDialog>
  );
}
