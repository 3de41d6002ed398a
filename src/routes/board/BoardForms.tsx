import { BatchFormDialog } from '../batch-form/BatchFormDialog.tsx';
import { ChainFormDialog } from '../chain-form/ChainFormDialog.tsx';
import { useBoardView } from './view/BoardView.tsx';
import { useBoardPanel } from './view/useBoardPanel.ts';

/** The form that the address asks for, if any. */
export function BoardForms() {
  const { panel, close } = useBoardPanel();
  const { board, can } = useBoardView();
  if (panel?.kind === 'new' && panel.what === 'chain' && can.editChains)
    return <ChainFormDialog chain={null} onClose={close} />;
  if (panel?.kind === 'new' && panel.what === 'batch' && can.editBatches)
    return <BatchFormDialog mode="new" onClose={close} />;
  if (panel?.kind === 'batch' && can.editBatches) {
    const batch = board.batches.find(({ id }) => id === panel.batchId);
    if (batch) return <BatchFormDialog key={batch.id} mode="edit" batch={batch} onClose={close} />;
  }
  return null;
}
