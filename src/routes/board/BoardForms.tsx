import { ChainFormDialog } from '../chain-form/ChainFormDialog.tsx';
import { useBoardView } from './view/BoardView.tsx';
import { useBoardPanel } from './view/useBoardPanel.ts';

/** The form that the address asks for, if any. */
export function BoardForms() {
  const { panel, close } = useBoardPanel();
  const { can } = useBoardView();
  if (panel?.kind === 'new' && panel.what === 'chain' && can.editChains)
    return <ChainFormDialog chain={null} onClose={close} />;
  return null;
}
