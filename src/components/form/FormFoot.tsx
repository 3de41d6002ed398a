import type { ReactNode } from 'react';
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
  failure: string | null;
  busy: boolean;
}

export function FormFoot(props: FormFootProps) {
  const { action, busyAction = 'Saving', onCancel, wide = false, aside, failure, busy } = props;
  const online = useOnline();
  return (
    // In a dialog the foot stays in sight, however long the form is.
    <div className="space-y-4 in-[[role=dialog]]:sticky in-[[role=dialog]]:-bottom-7 in-[[role=dialog]]:-mx-7 in-[[role=dialog]]:-mb-7 in-[[role=dialog]]:border-t in-[[role=dialog]]:border-line in-[[role=dialog]]:bg-paper in-[[role=dialog]]:px-7 in-[[role=dialog]]:py-4 max-tablet:in-[[role=dialog]]:-bottom-5 max-tablet:in-[[role=dialog]]:-mx-5 max-tablet:in-[[role=dialog]]:-mb-5 max-tablet:in-[[role=dialog]]:px-5">
      <ErrorSummary />
      <div aria-live="assertive" className="empty:hidden">
        {failure && <Notice kind="hold">{failure}</Notice>}
      </div>
      {!online && (
        <Notice kind="mind">
          No connection. What you typed stays here; save it when the connection is back.
        </Notice>
      )}
      <div className="flex flex-wrap items-center justify-end gap-3">
        {aside && <div className="mr-auto">{aside}</div>}
        {onCancel && (
          <Button look="quiet" onClick={onCancel}>
            Leave it
          </Button>
        )}
        <Button
          type="submit"
          look="first"
          size={wide ? 'large' : 'normal'}
          className={wide ? 'w-full' : ''}
          disabled={!online || busy}
        >
          {busy ? busyAction : action}
        </Button>
      </div>
    </div>
  );
}
