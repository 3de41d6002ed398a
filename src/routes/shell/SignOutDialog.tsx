import { Button } from '../../components/ui/Button.tsx';
import { Dialog } from '../../components/ui/Dialog.tsx';

interface SignOutDialogProps {
  waiting: number;
  onClose: () => void;
  onSignOut: () => void;
}

/** Asked before signing out while something that was written has not been sent. */
export function SignOutDialog({ waiting, onClose, onSignOut }: SignOutDialogProps) {
  const what = waiting === 1 ? 'One entry has' : `${waiting} entries have`;
  return (
    <Dialog open onClose={onClose} title="Sign out before everything is sent?">
      <div className="space-y-3 text-ink2">
        <p>{what} not been sent yet.</p>
        <p>
          Nothing is thrown away: what waits stays on this device, and is sent when you sign in here
          again. Nobody else sees it until then.
        </p>
      </div>
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button look="danger" onClick={onSignOut}>
          Sign out, send it later
        </Button>
        <Button look="first" onClick={onClose}>
          Stay signed in
        </Button>
      </div>
    </Dialog>
  );
}
