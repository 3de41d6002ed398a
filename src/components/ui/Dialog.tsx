import { useEffect, useMemo, useRef, useState } from 'react';
import { EnclosingDialog, isUnsaved, letGo } from '../../app/unsaved.ts';
import { LeaveDialog } from './LeaveDialog.tsx';
import { ModalCard, type ModalCardProps } from './ModalCard.tsx';

export interface DialogProps extends Omit<ModalCardProps, 'onLeave'> {
  open: boolean;
  onClose: () => void;
}

/** A modal card that asks before it closes over something typed and not saved. */
export function Dialog({ open, ...rest }: DialogProps) {
  return open ? <OpenDialog {...rest} /> : null;
}

/** Asks before it closes over something typed and not saved. */
function useLeaving(onClose: () => void) {
  const [isAsking, setAsking] = useState(false);
  const close = useRef(onClose);
  useEffect(() => {
    close.current = onClose;
  });
  const enclosing = useMemo(() => {
    const self = { leave: () => (isUnsaved(self) ? setAsking(true) : close.current()) };
    return self;
  }, []);
  const question = isAsking && (
    <LeaveDialog
      onStay={() => setAsking(false)}
      onLeave={() => {
        letGo(enclosing);
        setAsking(false);
        onClose();
      }}
    />
  );
  return { enclosing, question };
}

function OpenDialog({ onClose, children, ...card }: Omit<DialogProps, 'open'>) {
  const { enclosing, question } = useLeaving(onClose);
  return (
    <ModalCard {...card} onLeave={enclosing.leave}>
      <EnclosingDialog value={enclosing}>{children}</EnclosingDialog>
      {question}
    </ModalCard>
  );
}
