import { useEffect, useRef } from 'react';
import { areKeysOn } from './keysOn.ts';
import { shortcutOf, type ShortcutName } from './shortcuts.ts';

const TYPING =
  'input, textarea, select, [contenteditable]:not([contenteditable="false"]), [role="textbox"], [role="combobox"]';
/** While one of these is open, or a batch is in the hand, the keys are theirs. */
const OPEN = 'dialog[open], [role="menu"], [data-in-hand]';

function isForPage({ target, isComposing, defaultPrevented }: KeyboardEvent): boolean {
  if (isComposing || defaultPrevented) return false;
  if (target instanceof Element && target.closest(TYPING) !== null) return false;
  return document.querySelector(OPEN) === null;
}

/** While this is drawn, its key does something. It never does where somebody types. */
export function useShortcut(name: ShortcutName, run: () => void, isOffered = true) {
  const latest = useRef(run);
  useEffect(() => {
    latest.current = run;
  });
  useEffect(() => {
    if (!isOffered) return;
    const listen = (event: KeyboardEvent) => {
      if (shortcutOf(event) !== name || !isForPage(event) || !areKeysOn()) return;
      event.preventDefault();
      latest.current();
    };
    document.addEventListener('keydown', listen);
    return () => document.removeEventListener('keydown', listen);
  }, [name, isOffered]);
}
