import type { Chain } from '#shared/api/chain.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { ChainForm } from './ChainForm.tsx';

export interface ChainFormDialogProps {
  /** Absent or null: a new one. */
  chain?: Chain | null;
  onClose: () => void;
}

export function ChainFormDialog({ chain = null, onClose }: ChainFormDialogProps) {
  return (
    <Dialog open onClose={onClose} title={chain ? `Edit the shelf ${chain.name}` : 'New shelf'}>
      <ChainForm
        chain={chain}
        onCancel={onClose}
        onDone={() => {
          say(chain ? 'Saved.' : 'The shelf is up.');
          onClose();
        }}
      />
    </Dialog>
  );
}
