import { X } from 'lucide-react';
import { Dialog as Radix } from 'radix-ui';
import type { ReactNode } from 'react';
import { useFocusBack } from './useFocusBack.ts';

export interface DialogProps {
  open: boolean;
  onClose: () => void;
  title: string;
  /** One sentence under the title. */
  lead?: ReactNode;
  children: ReactNode;
  wide?: boolean;
}

/** A sheet from the foot of a phone, a card in the middle of anything larger. */
export function Dialog({ open, onClose, title, lead, children, wide = false }: DialogProps) {
  const focusBack = useFocusBack();
  return (
    <Radix.Root open={open} onOpenChange={(next) => !next && onClose()}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          {...focusBack}
          // A slip of the finger beside the card must not throw away what was typed.
          onPointerDownOutside={(event) => event.preventDefault()}
          onInteractOutside={(event) => event.preventDefault()}
          {...(lead ? {} : { 'aria-describedby': undefined })}
          className={`fixed z-40 max-h-[92dvh] overflow-y-auto overscroll-contain border border-line bg-paper p-5 text-ink shadow-2xl max-tablet:inset-x-0 max-tablet:bottom-0 max-tablet:rounded-t-2xl tablet:top-1/2 tablet:left-1/2 tablet:w-[calc(100vw-3rem)] tablet:-translate-1/2 tablet:rounded-card tablet:p-7 ${wide ? 'tablet:max-w-3xl' : 'tablet:max-w-xl'}`}
        >
          <div className="flex items-start gap-4">
            <Radix.Title className="grow font-display text-h2 font-bold tracking-[-.02em]">
              {title}
            </Radix.Title>
            <Radix.Close
              aria-label="Close"
              className="-mt-1 -mr-1 grid size-10 shrink-0 place-items-center rounded-lg text-ink2 hover:bg-line2 max-tablet:size-11"
            >
              <X size={20} aria-hidden="true" />
            </Radix.Close>
          </div>
          {lead && <Radix.Description className="mt-1 text-ink2">{lead}</Radix.Description>}
          <div className="mt-5">{children}</div>
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}
