import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { useBoardView } from '../board/view/BoardView.tsx';
import { usePourView } from './pourView.ts';

/** Somebody else has it in hand: seen live, and taken over in one tap where they cannot go on. */
export function Follower() {
  const { run, mine, busy, send } = usePourView();
  const { can } = useBoardView();
  if (mine || run.state !== 'open') return null;
  return (
    <Notice className="mt-3 max-w-xl">
      <p>
        <b>{run.heldBy.name} has this pour in hand.</b> You see it as it goes on.
      </p>
      {can.setStages && (
        <Button
          size="small"
          look="quiet"
          className="mt-2"
          disabled={busy}
          onClick={() =>
            void send({ kind: 'take-over', body: { runId: run.id } }).catch(() => undefined)
          }
        >
          Take it over
        </Button>
      )}
    </Notice>
  );
}
