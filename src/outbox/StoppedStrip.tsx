import { useState } from 'react';
import { Button } from '../components/ui/Button.tsx';
import { Notice } from '../components/ui/Notice.tsx';
import { OutboxDialog } from './OutboxDialog.tsx';
import { useOutbox } from './useOutbox.ts';

const sentence = (words: string) => (/[.?]$/.test(words) ? words : `${words}.`);

/** Across every page while something that was written was not taken. */
export function StoppedStrip() {
  const [first, ...behind] = useOutbox();
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      {first?.refusal && (
        <div className="px-7 pt-3 max-tablet:px-[18px] print:hidden">
          <Notice kind="hold" className="flex flex-wrap items-center gap-x-4 gap-y-2">
            <p className="min-w-0 flex-1 basis-64 wrap-anywhere">
              <span className="font-semibold">Not taken: {first.what}.</span>{' '}
              {sentence(first.refusal.sentence)}
              {behind.length > 0 && ' What you wrote after it waits.'}
            </p>
            <Button size="small" onClick={() => setOpen(true)}>
              Look and choose
            </Button>
          </Notice>
        </div>
      )}
      {isOpen && <OutboxDialog open onClose={() => setOpen(false)} />}
    </>
  );
}
