import { useState } from 'react';
import { Button } from '../../components/ui/Button.tsx';
import { ConfirmDialog } from '../../components/ui/ConfirmDialog.tsx';
import { usePourView } from './pourView.ts';

/** Ends the run without a pour. Its readings stay on the record. */
export function LeaveRun() {
  const { run, mine, busy, send } = usePourView();
  const [asking, setAsking] = useState(false);
  const [failure, setFailure] = useState<unknown>(null);
  if (!mine || run.state !== 'open') return null;
  return (
    <p className="mt-4 -ml-4">
      <Button look="text" onClick={() => setAsking(true)}>
        Leave this pour
      </Button>
      <ConfirmDialog
        open={asking}
        onClose={() => setAsking(false)}
        title="Leave this pour?"
        action="Leave the pour"
        busy={busy}
        error={failure}
        onConfirm={() => void send({ kind: 'leave', body: { runId: run.id } }).catch(setFailure)}
      >
        <p>Nothing is poured, and the link is free for another run. The readings stay.</p>
      </ConfirmDialog>
    </p>
  );
}
