import type { ReactNode } from 'react';
import type { Batch } from '#shared/api/batch.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { BatchForm } from './BatchForm.tsx';

export interface BatchFormDialogProps {
  mode: 'new' | 'edit' | 'duplicate';
  batch?: Batch | null;
  isGone?: boolean;
  onClose: () => void;
  /** Under the form, and no part of it. */
  foot?: ReactNode;
}

const TITLES = {
  new: () => 'New batch',
  edit: (name: string) => `Edit ${name}`,
  duplicate: (name: string) => `A copy of ${name}`,
};

export function BatchFormDialog({
  mode,
  batch = null,
  isGone = false,
  onClose,
  foot,
}: BatchFormDialogProps) {
  return (
    <Dialog
      open
      onClose={onClose}
      title={TITLES[mode](batch?.name ?? '')}
      {...(mode === 'new' && {
        lead: 'Name, gravity, colour and bitterness are enough to check a pour.',
      })}
    >
      <BatchForm
        mode={mode}
        batch={batch}
        isGone={isGone}
        onCancel={onClose}
        onDone={() => {
          void say(mode === 'edit' ? 'Saved.' : 'The batch is on the bench.');
          onClose();
        }}
      />
      {foot && <div className="mt-10">{foot}</div>}
    </Dialog>
  );
}
