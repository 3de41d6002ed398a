import { useEffect } from 'react';
import { intentOf, undoKeyOf } from './keys.ts';
import { drop, type LiftMachine } from './liftContext.ts';

const TYPING = 'input, textarea, select, [contenteditable="true"], dialog';

const isTyping = (target: EventTarget | null) =>
  target instanceof Element && target.closest(TYPING) !== null;

/** Keys while a batch is in the hand. On a button of the list Enter presses that button. */
function onLiftKey(machine: LiftMachine, event: KeyboardEvent) {
  const { lifted, over } = machine.store.get();
  if (lifted?.by !== 'keys' || isTyping(event.target)) return;
  const intent = intentOf(event);
  if (!intent) return;
  const onHandle = event.target instanceof Element && event.target.closest('[data-lift-handle]');
  if (!onHandle && intent !== 'put-back') return;
  event.preventDefault();
  event.stopPropagation();
  if (intent === 'put-back') machine.lifting.cancel();
  else if (intent === 'put-down') drop(machine, over);
  else machine.lifting.walk(intent);
}

function onUndoKey(machine: LiftMachine, event: KeyboardEvent) {
  const which = undoKeyOf(event);
  if (!which || isTyping(event.target) || machine.store.get().lifted) return;
  event.preventDefault();
  machine.putting[which]();
}

/** Listens on the whole page: the focus may be in the list of places, or nowhere. */
export function useLiftKeys(machine: LiftMachine, takesUndo: boolean) {
  useEffect(() => {
    const listen = (event: KeyboardEvent) => {
      onLiftKey(machine, event);
      if (takesUndo) onUndoKey(machine, event);
    };
    document.addEventListener('keydown', listen, true);
    return () => document.removeEventListener('keydown', listen, true);
  }, [machine, takesUndo]);
}
