import { useState } from 'react';
import { vessel as vesselContract, vesselCreate, type Vessel } from '#shared/api/vessel.ts';
import { useBoard } from '../../api/board.ts';
import { useVesselCreate, useVesselPatch } from '../../api/vessels.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { DeleteVessel } from './DeleteVessel.tsx';
import { VesselFields } from './VesselFields.tsx';
import { vesselValues } from './vesselValues.ts';
import { vesselLabel, vesselWords } from './vesselWords.ts';

export interface VesselDialogProps {
  /** Null: a new one. */
  vessel: Vessel | null;
  onClose: () => void;
}

export function VesselDialog({ vessel, onClose }: VesselDialogProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const now = useBoard().vessels.find(({ id }) => id === vessel?.id);
  const create = useVesselCreate(slug);
  const patch = useVesselPatch(slug);
  const [values] = useState(() => vesselValues(vessel, units));
  const [deleting, setDeleting] = useState(false);
  return (
    <Dialog open onClose={onClose} title={vessel ? `Edit ${vessel.name}` : 'New vessel'}>
      <RowForm
        row={now ?? vessel}
        isGone={vessel !== null && !now}
        rowSchema={vesselContract}
        contract={vesselCreate}
        keepsTyped
        values={values}
        create={create.mutateAsync}
        patch={patch.mutateAsync}
        labelOf={vesselLabel}
        wordsOf={(key, facts) => vesselWords(key, facts, units)}
        action={vessel ? 'Save' : 'Add the vessel'}
        onCancel={onClose}
        onDone={() => {
          say(vessel ? 'Saved.' : 'The vessel is in the list.');
          onClose();
        }}
        aside={
          <Button look="danger" onClick={() => setDeleting(true)}>
            Delete
          </Button>
        }
      >
        <VesselFields />
      </RowForm>
      {deleting && vessel && (
        <DeleteVessel vessel={vessel} onClose={() => setDeleting(false)} onDone={onClose} />
      )}
    </Dialog>
  );
}
