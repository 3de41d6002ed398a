import { useRef } from 'react';

/**
 * Gives the focus back to what had it when a dialog opened. Radix does so only for a dialog with a
 * trigger of its own; ours are opened from wherever they are wanted.
 */
export function useFocusBack() {
  const opener = useRef<Element | null>(null);
  return {
    onOpenAutoFocus: () => {
      opener.current = document.activeElement;
    },
    onCloseAutoFocus: (event: Event) => {
      event.preventDefault();
      if (opener.current instanceof HTMLElement) opener.current.focus();
    },
  };
}
