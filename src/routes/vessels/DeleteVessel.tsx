import type { Vessel } from '#shared/api/vessel.ts';
import { useVesselDelete } from '../../api/vessels.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';

export interface DeleteVesselProps {
  vessel: Vessel;
  onClose: () => void;
  onDone: () => void;
}

export function DeleteVessel({ vessel, onClose, onDone }: DeleteVesselProps) {
  const { slug } = useBrewery();
  const remove = useVesselDelete(slug);
  return (
    <ConfirmDialog
      open
      onClose={onClose}
      title={`Delete ${vessel.name}?`}
      action="Delete the vessel"
      busy={remove.isPending}
      error={remove.error}
      onConfirm={() =>
        remove.mutate({ id: vessel.id, version: vessel.version }, { onSuccess: onDone })
      }
    >
      <p>It goes from the list. While a shelf or a batch stands in it, it stays.</p>
    </ConfirmDialog>
  );
}
