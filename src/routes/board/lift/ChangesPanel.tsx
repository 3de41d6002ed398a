import { useBoard } from '../../../api/board.ts';
import { Button } from '../../../components/ui/Button.tsx';
import { Notice } from '../../../components/ui/Notice.tsx';
import { ChangedLinks } from './ChangedLinks.tsx';
import { useLiftMachine, useLiftState } from './liftContext.ts';
import type { Change } from './liftState.ts';
import { ShiftedDates } from './ShiftedDates.tsx';
import { batchName, standing } from './words.ts';

/** After a drop: what it changed, and the ways back. Or why it did not happen. */
export function ChangesPanel() {
  const change = useLiftState((state) => state.change);
  const refusal = useLiftState((state) => state.refusal);
  const { store } = useLiftMachine();
  const close = (
    <Button look="quiet" size="small" onClick={() => store.set({ change: null, refusal: null })}>
      Close
    </Button>
  );
  if (refusal)
    return (
      <section aria-label="Not moved" className="flex flex-col items-start gap-3">
        <h2 className="text-h2">Not moved</h2>
        <Notice kind="mind">{refusal}</Notice>
        {close}
      </section>
    );
  if (!change) return null;
  return (
    <section aria-label="What the move changed" className="flex flex-col gap-4">
      <ChangeHead change={change} />
      <ShiftedDates shifted={change.shifted} />
      <Cleared cleared={change.cleared} />
      <ChangedLinks change={change} />
      <WaysBack change={change} />
      <div>{close}</div>
    </section>
  );
}

function ChangeHead({ change }: { change: Change }) {
  const board = useBoard();
  const { batchId } = change.request;
  return (
    <header>
      <h2 className="text-h2 [overflow-wrap:anywhere]">{batchName(board, batchId)} moved</h2>
      <p className="mt-1 text-ink2">
        Now {standing(board, batchId)}
        {change.request.dates === 'keep' && ', with the dates as they were'}.
        {change.status === 'saving' && ' Saving …'}
      </p>
    </header>
  );
}

/** A kept part belongs to its link; with the link it goes. */
function Cleared({ cleared }: { cleared: Change['cleared'] }) {
  const board = useBoard();
  if (cleared.length === 0) return null;
  const names = cleared.map((id) => batchName(board, id)).join(', ');
  return (
    <p className="text-small text-ink2">
      What was settled for the pour of <b className="text-ink">{names}</b> (kept part, acceptance)
      went with the link that ended. Undo brings it back.
    </p>
  );
}

function WaysBack({ change }: { change: Change }) {
  const { putting } = useLiftMachine();
  const isSaved = change.status === 'saved';
  const hasShifted = change.request.dates === 'pull' && change.shifted.length > 0;
  return (
    <div className="flex flex-wrap gap-2.5">
      <Button size="small" disabled={!isSaved} onClick={putting.undo}>
        Undo
      </Button>
      {hasShifted && (
        <Button size="small" look="quiet" disabled={!isSaved} onClick={putting.keepDates}>
          Keep my dates instead
        </Button>
      )}
    </div>
  );
}
