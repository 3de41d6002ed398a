import { use, type ReactNode } from 'react';
import { sentenceOf } from '../../api/errors.ts';
import { KeptOffline } from '../../app/keptOffline.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from './Button.tsx';
import { Dialog } from './Dialog.tsx';
import { Notice } from './Notice.tsx';
import { OFFLINE_SENTENCE } from './offlineSentence.ts';

export interface ConfirmDialogProps {
  open: boolean;
  onClose: () => void;
  title: string;
  /** What will happen, in full sentences. */
  children: ReactNode;
  /** The word on the button: what it does, never "OK". */
  action: string;
  /** The word on the way back, where "Leave it" could be mistaken. */
  keep?: string;
  onConfirm: () => void;
  busy?: boolean;
  error?: unknown;
  /** It changes nothing on the server. */
  worksOffline?: boolean;
}

export function ConfirmDialog(props: ConfirmDialogProps) {
  const isOnline = useOnline();
  const isKept = use(KeptOffline);
  const online = isOnline || isKept || props.worksOffline === true;
  return (
    <Dialog open={props.open} onClose={props.onClose} title={props.title}>
      <div className="space-y-3 text-ink2">{props.children}</div>
      <div className="mt-4 space-y-3" aria-live="polite">
        {props.error ? <Notice kind="hold">{sentenceOf(props.error)}</Notice> : null}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button look="quiet" onClick={props.onClose}>
          {props.keep ?? 'Leave it'}
        </Button>
        <Button look="danger" disabled={!online || props.busy} onClick={props.onConfirm}>
          {props.action}
        </Button>
      </div>
    </Dialog>
  );
}
