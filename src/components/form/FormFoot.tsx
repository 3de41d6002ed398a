import { use, type ReactNode } from 'react';
import { KeptOffline } from '../../app/keptOffline.ts';
import { EnclosingDialog } from '../../app/unsaved.ts';
import { useOnline } from '../../app/useOnline.ts';
import { Button } from '../ui/Button.tsx';
import { Notice } from '../ui/Notice.tsx';
import { ErrorSummary } from './ErrorSummary.tsx';

export interface FormFootProps {
  action: string;
  busyAction?: string;
  onCancel?: () => void;
  wide?: boolean;
  aside?: ReactNode;
  /** What the contract found at the fields. */
  messages: readonly string[];
  failure: string | null;
  busy: boolean;
}

export function FormFoot(props: FormFootProps) {
  const {
    action,
    busyAction = 'Saving',
    onCancel,
    wide = false,
    aside,
    messages,
    failure,
    busy,
  } = props;
  const online = useOnline();
  const isKept = use(KeptOffline);
  const dialog = use(EnclosingDialog);
  return (
    // In a dialog the foot stays in sight, however long the form is.
    <div className="space-y-4 in-[dialog]:sticky in-[dialog]:-bottom-7 in-[dialog]:-mx-7 in-[dialog]:-mb-7 in-[dialog]:border-t in-[dialog]:border-line in-[dialog]:bg-paper in-[dialog]:px-7 in-[dialog]:py-4 max-tablet:in-[dialog]:-bottom-5 max-tablet:in-[dialog]:-mx-5 max-tablet:in-[dialog]:-mb-5 max-tablet:in-[dialog]:px-5">
      <ErrorSummary messages={messages} />
      <div aria-live="assertive" className="empty:hidden">
        {failure && <Notice kind="hold">{failure}</Notice>}
      </div>
      {!online && (
        <Notice kind="mind">
          {isKept
            ? 'No connection. It is kept on this device, and sent when the connection is back.'
            : 'No connection. What you typed stays here; save it when the connection is back.'}
        </Notice>
      )}
      <div className="flex flex-wrap items-center justify-end gap-3">
        {aside && <div className="mr-auto">{aside}</div>}
        {onCancel && (
          <Button look="quiet" onClick={dialog?.leave ?? onCancel}>
            Leave it
          </Button>
        )}
        <Button
          type="submit"
          look="first"
          size={wide ? 'large' : 'normal'}
          className={wide ? 'w-full' : ''}
          disabled={(!online && !isKept) || busy}
        >
          {busy ? busyAction : action}
        </Button>
      </div>
    </div>
  );
}
