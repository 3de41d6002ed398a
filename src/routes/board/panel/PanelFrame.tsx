import { X } from 'lucide-react';
import { useEffect, useRef, type ReactNode } from 'react';

interface PanelFrameProps {
  label: string;
  onClose: () => void;
  children: ReactNode;
}

/** Escape closes, wherever the focus is; a menu or dialog above takes it first. */
function useEscape(onClose: () => void) {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (event.key === 'Escape' && !event.defaultPrevented) onClose();
    };
    document.addEventListener('keydown', onKeyDown);
    return () => document.removeEventListener('keydown', onKeyDown);
  }, [onClose]);
}

/** What stands open beside the shelves. Takes the focus when it opens; Escape closes it. */
export function PanelFrame({ label, onClose, children }: PanelFrameProps) {
  const ref = useRef<HTMLElement>(null);
  useEffect(() => {
    const before = document.activeElement;
    ref.current?.focus({ preventScroll: true });
    return () => {
      if (before instanceof HTMLElement && before.isConnected)
        before.focus({ preventScroll: true });
    };
  }, []);
  useEscape(onClose);
  return (
    <section
      ref={ref}
      tabIndex={-1}
      aria-label={label}
      className="relative animate-panel-in wrap-anywhere px-6 pt-5 pb-10 outline-none max-tablet:px-[18px]"
    >
      <button
        type="button"
        aria-label="Close the panel"
        onClick={onClose}
        className="absolute top-3 right-3 z-10 grid size-9 place-items-center rounded-lg text-ink2 hover:bg-line2 max-tablet:size-11"
      >
        <X size={20} aria-hidden />
      </button>
      {children}
    </section>
  );
}

/** A part of a panel under its own rule. */
export function PanelPart({
  title,
  tone,
  children,
}: {
  title: ReactNode;
  tone?: string;
  children: ReactNode;
}) {
  return (
    <section className="border-t border-line py-[13px]">
      <h3 className={`text-[1.03125rem] leading-tight font-[680] ${tone ?? ''}`}>{title}</h3>
      {children}
    </section>
  );
}
