import { X } from 'lucide-react';
import { useId, type KeyboardEvent, type ReactNode } from 'react';
import { createPortal } from 'react-dom';
import { useModal } from './useModal.ts';

export interface ModalCardProps {
  title: string;
  /** One sentence under the title. */
  lead?: ReactNode;
  children: ReactNode;
  wide?: boolean;
  /** Escape, back on a phone, or its Close. */
  onLeave: () => void;
}

/** A sheet from the foot of a phone, a card in the middle of anything larger. */
export const ModalCard = (props: ModalCardProps) =>
  createPortal(<Card {...props} />, document.body);

function Card({ title, lead, children, wide = false, onLeave }: ModalCardProps) {
  const id = useId();
  const modal = useModal(onLeave);
  const onKeyDown = (event: KeyboardEvent) => {
    if (event.key !== 'Escape' || event.defaultPrevented) return;
    event.preventDefault();
    event.stopPropagation();
    onLeave();
  };
  return (
    <dialog
      ref={modal.dialog}
      aria-labelledby={`${id}-title`}
      aria-describedby={lead ? `${id}-lead` : undefined}
      onKeyDown={onKeyDown}
      onCancel={(event) => {
        if (event.target !== event.currentTarget) return;
        event.preventDefault();
        onLeave();
      }}
      className={`thumb-slim fixed max-h-[92dvh] overflow-y-auto overscroll-contain border border-line bg-paper p-5 text-body text-ink shadow-2xl backdrop:bg-veil max-tablet:inset-x-0 max-tablet:top-auto max-tablet:bottom-0 max-tablet:w-full max-tablet:max-w-none max-tablet:rounded-t-2xl tablet:m-auto tablet:w-[calc(100vw-3rem)] tablet:rounded-card tablet:p-7 ${wide ? 'tablet:max-w-3xl' : 'tablet:max-w-xl'}`}
    >
      <div className="flex items-start gap-4">
        <h2
          ref={modal.title}
          id={`${id}-title`}
          tabIndex={-1}
          className="grow font-display text-h2 font-bold tracking-[-.02em] outline-none"
        >
          {title}
        </h2>
        <button
          type="button"
          aria-label="Close"
          onClick={onLeave}
          className="-mt-1 -mr-1 grid size-10 shrink-0 place-items-center rounded-lg text-ink2 hover:bg-line2 max-tablet:size-11"
        >
          <X size={20} aria-hidden="true" />
        </button>
      </div>
      {lead && (
        <p id={`${id}-lead`} className="mt-1 text-ink2">
          {lead}
        </p>
      )}
      <div className="mt-5">{children}</div>
    </dialog>
  );
}
