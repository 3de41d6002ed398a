import { sentenceOf } from '../../api/errors.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OFFLINE_SENTENCE } from '../../components/ui/offlineSentence.ts';

export interface DialogFootProps {
  action: string;
  change: { isPending: boolean; error: unknown };
  disabled?: boolean;
  onDo: () => void;
  onClose: () => void;
}

/** What went wrong, and the two ways out. */
export function DialogFoot({ action, change, disabled, onDo, onClose }: DialogFootProps) {
  const online = useOnline();
  return (
    <>
      <div className="mt-4 space-y-3" aria-live="polite">
        {change.error ? <Notice kind="hold">{sentenceOf(change.error)}</Notice> : null}
        {!online && <Notice kind="mind">{OFFLINE_SENTENCE}</Notice>}
      </div>
      <div className="mt-5 flex flex-wrap justify-end gap-3">
        <Button look="quiet" onClick={onClose}>
          Leave it
        </Button>
        <Button look="first" disabled={!online || change.isPending || disabled} onClick={onDo}>
          {action}
        </Button>
      </div>
    </>
  );
}
