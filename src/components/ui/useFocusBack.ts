import { useRef } from 'react';

/**
 * Gives the focus back to what had it when a dialog opened. Radix does so only for a dialog with a
 * trigger of its own; ours are opened from wherever they are wanted.
 */
export function useFocusBack() {
  const opener = useRef<Element | null>(null);
  return {
    onOpenAutoFocus: (event: Event) => {
      opener.current = document.activeElement;
      // The dialog itself, not its Close button: the title is read, and Tab goes on from there.
      event.preventDefault();
      if (event.currentTarget instanceof HTMLElement) event.currentTarget.focus();
    },
    onCloseAutoFocus: (event: Event) => {
      event.preventDefault();
      if (opener.current instanceof HTMLElement) opener.current.focus();
    },
  };
}
