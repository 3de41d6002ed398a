import { TriangleAlert, Upload } from 'lucide-react';
import { useEffect, useState } from 'react';
import { useOnline } from '../app/useOnline.ts';
import { OutboxDialog } from './OutboxDialog.tsx';
import { useOutbox, useSending } from './useOutbox.ts';

/** How much waits to be sent, at the top of every page; nothing where nothing waits. */
export function OutboxMark() {
  useSending();
  const entries = useOutbox();
  const [isOpen, setOpen] = useState(false);
  const count = entries.length;
  const isStopped = Boolean(entries[0]?.refusal);
  const isTold = useTold(count > 0) || isStopped;
  return (
    <>
      {isTold && (
        <button
          type="button"
          aria-label={isStopped ? '1 not taken' : `${count} waiting`}
          onClick={() => setOpen(true)}
          className="flex min-h-8 items-center gap-1.5 rounded-full border-[1.5px] border-on-bar px-2.5 font-semibold whitespace-nowrap text-on-bar max-tablet:min-h-11 max-tablet:min-w-11 max-tablet:justify-center"
        >
          {isStopped ? <TriangleAlert size={16} aria-hidden /> : <Upload size={16} aria-hidden />}
          {isStopped ? 1 : count}
          <span className="max-tablet:hidden">{isStopped ? 'not taken' : 'waiting'}</span>
        </button>
      )}
      <span aria-live="polite" className="sr-only">
        {isTold && spoken(count, isStopped)}
      </span>
      {isOpen && <OutboxDialog open onClose={() => setOpen(false)} />}
    </>
  );
}

const ON_ITS_WAY_MS = 1500;

/** What is on its way is not told of: only what cannot be sent now, or has waited for a while. */
function useTold(waits: boolean): boolean {
  const online = useOnline();
  const [isLong, setLong] = useState(false);
  useEffect(() => {
    if (!waits) return;
    const timer = window.setTimeout(() => setLong(true), ON_ITS_WAY_MS);
    return () => {
      window.clearTimeout(timer);
      setLong(false);
    };
  }, [waits]);
  return waits && (isLong || !online);
}

function spoken(count: number, isStopped: boolean): string {
  if (isStopped) return 'Something that you wrote was not taken by the server. Nothing is lost.';
  return count === 1 ? 'One entry waits to be sent.' : `${count} entries wait to be sent.`;
}
