import { createContext, use, useLayoutEffect } from 'react';

/** A dialog, as what is inside it sees it. */
export interface Enclosing {
  /** Closes it as its own Close does: whatever was typed in it is asked about first. */
  leave: () => void;
}

/** The dialog around a form; null on a page. */
export const EnclosingDialog = createContext<Enclosing | null>(null);

const holders = new Set<{ within: Enclosing | null }>();

/** While true, what was typed here is lost by leaving: the way out asks first. */
export function useUnsaved(hasTyped: boolean) {
  const within = use(EnclosingDialog);
  useLayoutEffect(() => {
    if (!hasTyped) return;
    const holder = { within };
    holders.add(holder);
    return () => void holders.delete(holder);
  }, [hasTyped, within]);
}

/** Whether something was typed and not saved: anywhere, or in one dialog. */
export const isUnsaved = (within?: Enclosing): boolean =>
  [...holders].some((holder) => within === undefined || holder.within === within);

/** It was asked about and may go. */
export function letGo(within: Enclosing): void {
  for (const holder of holders) if (holder.within === within) holders.delete(holder);
}
