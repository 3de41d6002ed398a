import { useState } from 'react';
import { Button } from '../../components/ui/Button.tsx';
import { Dialog } from '../../components/ui/Dialog.tsx';
import { Closing } from './Closing.tsx';
import { Unsent } from './Unsent.tsx';

export function CloseAccount() {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <p className="mt-1 mb-4 text-ink2">
        You leave your breweries, and “a former brewer” takes the place of your name. What you did
        stays in the record of those who go on.
      </p>
      <Button look="danger" onClick={() => setOpen(true)}>
        Close the account
      </Button>
      <Dialog
        open={isOpen}
        onClose={() => setOpen(false)}
        title="Close your account?"
        lead="This cannot be taken back."
      >
        <Unsent />
        <Closing onClose={() => setOpen(false)} />
      </Dialog>
    </>
  );
}
