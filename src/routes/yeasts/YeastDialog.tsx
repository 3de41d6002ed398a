import { useState } from 'react';
import { yeast as yeastContract, yeastCreate, type Yeast } from '#shared/api/yeast.ts';
import { useBoard } from '../../api/board.ts';
import { useYeastCreate, useYeastPatch } from '../../api/yeasts.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useUnits } from '../../app/useUnits.ts';
import { RowForm } from '../../components/form/RowForm.tsx';
import { Button } from '../../components/ui/Button.tsx';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { DeleteYeast } from './DeleteYeast.tsx';
import { YeastFields } from './YeastFields.tsx';
import { yeastValues } from './yeastValues.ts';
import { yeastLabel, yeastWords } from './yeastWords.ts';

export interface YeastDialogProps {
  /** Null: a new one. */
  yeast: Yeast | null;
  onClose: () => void;
}

export function YeastDialog({ yeast, onClose }: YeastDialogProps) {
  const { slug } = useBrewery();
  const units = useUnits();
  const { yeasts, brewery } = useBoard();
  const { currency } = brewery;
  const now = yeasts.find(({ id }) => id === yeast?.id);
  const create = useYeastCreate(slug);
  const patch = useYeastPatch(slug);
  const [values] = useState(() => yeastValues(yeast, units, currency));
  const [deleting, setDeleting] = useState(false);
  return (
    <Dialog open onClose={onClose} title={yeast ? `Edit ${yeast.name}` : 'New yeast'}>
      <RowForm
        row={now ?? yeast}
        isGone={yeast !== null && !now}
        rowSchema={yeastContract}
        contract={yeastCreate}
        keepsTyped
        values={values}
        create={create.mutateAsync}
        patch={patch.mutateAsync}
        labelOf={yeastLabel}
        wordsOf={(key, facts) => yeastWords(key, facts, units, currency)}
        action={yeast ? 'Save' : 'Add the yeast'}
        onCancel={onClose}
        onDone={() => {
          say(yeast ? 'Saved.' : 'The yeast is in the list.');
          onClose();
        }}
        aside={
          <Button look="danger" onClick={() => setDeleting(true)}>
            Delete
          </Button>
        }
      >
        <YeastFields currency={currency} />
      </RowForm>
      {deleting && yeast && (
        <DeleteYeast yeast={yeast} onClose={() => setDeleting(false)} onDone={onClose} />
      )}
    </Dialog>
  );
}
