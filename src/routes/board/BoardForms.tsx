import { useState } from 'react';
import { useIsGuestHere } from '../../api/board.ts';
import { lazyPart } from '../../app/lazyPart.tsx';
import { useBrewery } from '../../app/useBrewery.ts';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BatchFormDialog } from '../batch-form/BatchFormDialog.tsx';
import { ChainFormDialog } from '../chain-form/ChainFormDialog.tsx';
import { BatchFacts } from './batch/BatchFacts.tsx';
import { OnBoardOf } from './guest/OnBoardOf.tsx';
import { useBoardView } from './view/BoardView.tsx';
import { useBoardPanel, type BoardPanel } from './view/useBoardPanel.ts';

/** Comes with the first batch that is opened. */
const FoldedTalk = lazyPart(async () => (await import('../talk/FoldedTalk.tsx')).FoldedTalk);

/** The form that the address asks for, if any; whoever may not write sees the facts. */
export function BoardForms() {
  const { panel, close } = useBoardPanel();
  switch (panel?.kind) {
    case 'batch':
      return (
        <OnBoardOf batchId={panel.batchId}>
          <OpenedBatch key={panel.batchId} batchId={panel.batchId} onClose={close} />
        </OnBoardOf>
      );
    case 'new':
      return <NewRow panel={panel} onClose={close} />;
    default:
      return null;
  }
}

/** A lost connection closes no form: what was typed waits in it. */
function OpenedBatch({ batchId, onClose }: { batchId: string; onClose: () => void }) {
  const { board, index } = useBoardView();
  const isGuest = useIsGuestHere();
  const now = index.batch(batchId);
  // Whoever deletes it elsewhere closes no form here.
  const [seen, setSeen] = useState(now);
  if (now && now !== seen) setSeen(now);
  const batch = now ?? seen;
  if (!batch)
    return (
      <Dialog open onClose={onClose} title="This batch is not on the board">
        <p className="text-ink2">Somebody deleted it, or the address is of another season.</p>
      </Dialog>
    );
  const talk = !isGuest && now && (
    <>
      <ToRecord batchId={batchId} />
      {now.chainId && <FoldedTalk chainId={now.chainId} about={{ kind: 'batch', batchId }} />}
    </>
  );
  if (!board.me.can.editBatches) return <BatchFacts batch={batch} onClose={onClose} foot={talk} />;
  return <BatchFormDialog mode="edit" batch={batch} isGone={!now} onClose={onClose} foot={talk} />;
}

function ToRecord({ batchId }: { batchId: string }) {
  const { path } = useBrewery();
  return (
    <p className="mb-4">
      <TextLink to={path(`batches/${batchId}`)}>Readings, notes and the cake check</TextLink>
    </p>
  );
}

interface NewRowProps {
  panel: Extract<BoardPanel, { kind: 'new' }>;
  onClose: () => void;
}

function NewRow({ panel, onClose }: NewRowProps) {
  const { board, index } = useBoardView();
  const may = board.me.can;
  if (panel.what === 'chain')
    return may.editChains ? <ChainFormDialog chain={null} onClose={onClose} /> : null;
  if (!may.editBatches) return null;
  const like = index.batch(panel.likeId ?? '');
  return like ? (
    <BatchFormDialog mode="duplicate" batch={like} onClose={onClose} />
  ) : (
    <BatchFormDialog mode="new" onClose={onClose} />
  );
}
