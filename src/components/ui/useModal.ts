import { useEffect, useLayoutEffect, useRef } from 'react';

/** Whether the page has a scrollbar, whose room is to stay while the page is held. */
const hasGutter = () => window.innerWidth > document.documentElement.clientWidth;

/** Where the focus was before each dialog. */
const openers = new WeakMap<Element, Element | null>();

/** Where it was before a dialog, and before those around it that are closed by now. */
function openerOf(modal: Element): Element | null {
  const opener = openers.get(modal) ?? null;
  const closed = opener?.closest('dialog:not([open])');
  return closed ? openerOf(closed) : opener;
}

/** Back to where one was; where that is gone, to the page, not to its very beginning. */
function focusAfter(modal: Element) {
  const opener = openerOf(modal);
  const hasOpener = opener instanceof HTMLElement && opener.isConnected && opener !== document.body;
  const next = hasOpener ? opener : document.getElementById('main');
  if (!next) return;
  if (!hasOpener && !next.hasAttribute('tabindex')) next.setAttribute('tabindex', '-1');
  next.focus({ preventScroll: true });
}

/**
 * Opens the browser's own modal dialog over everything else, with the focus on its title. Every
 * way that the browser has to close it (Escape, back on a phone) asks `onLeave` instead.
 */
export function useModal(onLeave: () => void) {
  const dialog = useRef<HTMLDialogElement>(null);
  const title = useRef<HTMLHeadingElement>(null);
  const leave = useRef(onLeave);
  useEffect(() => {
    leave.current = onLeave;
  });
  useLayoutEffect(() => {
    const modal = dialog.current;
    if (!modal) return;
    openers.set(modal, document.activeElement);
    if (hasGutter()) modal.dataset.gutter = '';
    modal.showModal();
    title.current?.focus({ preventScroll: true });
    const ask = () => leave.current();
    // A browser may close it without asking, when it was asked once before.
    const reopen = () => {
      modal.showModal();
      ask();
    };
    modal.addEventListener('close', reopen);
    return () => {
      modal.removeEventListener('close', reopen);
      modal.close();
      focusAfter(modal);
    };
  }, []);
  return { dialog, title };
}
