import type { Batch } from '#shared/api/batch.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { say } from '../../components/ui/Toast.tsx';
import { BatchForm } from '../batch-form/BatchForm.tsx';
import { ChainFormDialog } from '../chain-form/ChainFormDialog.tsx';
import { BatchFacts } from './batch/BatchFacts.tsx';
import { useBoardView } from './view/BoardView.tsx';
import { useBoardPanel } from './view/useBoardPanel.ts';

/** The form that the address asks for, if any; whoever may not write sees the facts. */
export function BoardForms() {
  const { panel, close } = useBoardPanel();
  const { board, index } = useBoardView();
  const may = board.me.can;
  switch (panel?.kind) {
    case 'batch': {
      const batch = index.batch(panel.batchId);
      if (!batch) return <GoneBatch onClose={close} />;
      if (!may.editBatches) return <BatchFacts batch={batch} onClose={close} />;
      return <BatchDialog key={batch.id} mode="edit" batch={batch} onClose={close} />;
    }
    case 'new': {
      const like = index.batch(panel.likeId ?? '') ?? null;
      if (panel.what === 'chain')
        return may.editChains ? <ChainFormDialog chain={null} onClose={close} /> : null;
      if (!may.editBatches) return null;
      return <BatchDialog mode={like ? 'duplicate' : 'new'} batch={like} onClose={close} />;
    }
    default:
      return null;
  }
}

function GoneBatch({ onClose }: { onClose: () => void }) {
  return (
    <Dialog open onClose={onClose} title="This batch is not on the board">
      <p className="text-ink2">Somebody deleted it, or the address is of another season.</p>
    </Dialog>
  );
}

interface BatchDialogProps {
  mode: 'new' | 'edit' | 'duplicate';
  batch: Batch | null;
  onClose: () => void;
}

const TITLES = { new: 'New batch', edit: 'Edit', duplicate: 'Copy of' } as const;
const DONE = {
  new: 'The batch is on the bench.',
  edit: 'Saved.',
  duplicate: 'The copy is on the bench.',
} as const;

function BatchDialog({ mode, batch, onClose }: BatchDialogProps) {
  return (
    <Dialog
      open
      wide
      onClose={onClose}
      title={batch ? `${TITLES[mode]} ${batch.name}` : TITLES[mode]}
    >
      <BatchForm
        mode={mode}
        batch={batch}
        onCancel={onClose}
        onDone={() => {
          say(DONE[mode]);
          onClose();
        }}
      />
    </Dialog>
  );
}
