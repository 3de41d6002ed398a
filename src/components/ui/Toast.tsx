import { lazy, Suspense } from 'react';

const LAYER = 'toasts';

/** Lifts the toasts above whatever dialog stands open now: the newest in the top layer is uppermost. */
function raise() {
  const layer = document.getElementById(LAYER);
  if (!layer) return;
  layer.hidePopover();
  layer.showPopover();
}

/** Short word of what was done. What went wrong stands where it went wrong, not here. */
export async function say(sentence: string): Promise<void> {
  const { toast } = await import('sonner');
  raise();
  toast(sentence);
}

/** The same, with a way back for as long as it stands. */
export async function sayUndoable(sentence: string, undo: () => void): Promise<void> {
  const { toast } = await import('sonner');
  raise();
  toast(sentence, { duration: 8000, action: { label: 'Undo', onClick: undo } });
}

/** Loaded beside the page, not before it: nothing is said in its first moment. */
const Sonner = lazy(async () => ({ default: (await import('sonner')).Toaster }));

export const Toaster = () => (
  <div id={LAYER} popover="manual" className="fixed inset-auto size-0 overflow-visible">
    <Suspense>
      <Sonner
        position="bottom-center"
        duration={5000}
        offset={24}
        mobileOffset={84}
        toastOptions={{
          unstyled: true,
          classNames: {
            content: 'min-w-0 flex-1',
            actionButton:
              'shrink-0 rounded-lg border-[1.5px] border-stone px-3 py-1 font-semibold text-stone max-tablet:min-h-11',
          },
          className:
            'flex w-full items-center gap-3 rounded-xl border border-line bg-ink px-4 py-3 font-sans text-body font-medium text-stone shadow-card',
        }}
      />
    </Suspense>
  </div>
);
