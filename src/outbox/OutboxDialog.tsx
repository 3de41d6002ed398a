import { useOnline } from '../app/useOnline.ts';
import { Button } from '../components/ui/Button.tsx';
import { Dialog } from '../components/ui/Dialog.tsx';
import { outbox } from './outbox.ts';
import { OutboxEntry } from './OutboxEntry.tsx';
import { useOutbox } from './useOutbox.ts';

/** What was written and not sent yet, oldest first, and what to do about it. */
export function OutboxDialog({ open, onClose }: { open: boolean; onClose: () => void }) {
  const entries = useOutbox();
  const online = useOnline();
  const isStopped = Boolean(entries[0]?.refusal);
  return (
    <Dialog
      open={open}
      onClose={onClose}
      title="Waiting to be sent"
      lead="Kept on this device, sent in this order, each once."
    >
      {entries.length === 0 ? (
        <p className="text-ink2">Everything has been sent.</p>
      ) : (
        <ol className="space-y-3">
          {entries.map((entry) => (
            <OutboxEntry key={entry.id} entry={entry} isBehind={isStopped && !entry.refusal} />
          ))}
        </ol>
      )}
      <div className="mt-5 flex flex-wrap items-center justify-end gap-3">
        {!online && <p className="grow text-small text-ink2">Sent once the connection is back.</p>}
        {entries.length > 0 && !isStopped && (
          <Button disabled={!online} onClick={() => void outbox.flush()}>
            Send now
          </Button>
        )}
        <Button look={isStopped ? 'quiet' : 'first'} onClick={onClose}>
          Done
        </Button>
      </div>
    </Dialog>
  );
}
