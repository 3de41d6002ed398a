/** What a key press asks of a lifted batch. */
export type Intent = 'next' | 'previous' | 'better' | 'worse' | 'best' | 'put-down' | 'put-back';

export interface KeyPress {
  key: string;
  ctrlKey: boolean;
  metaKey: boolean;
  altKey: boolean;
  shiftKey: boolean;
}

const INTENTS: Readonly<Record<string, Intent>> = {
  ArrowRight: 'next',
  ArrowLeft: 'previous',
  ArrowDown: 'worse',
  ArrowUp: 'better',
  Home: 'best',
  Enter: 'put-down',
  ' ': 'put-down',
  Escape: 'put-back',
};

const hasModifier = (press: KeyPress) => press.ctrlKey || press.metaKey || press.altKey;

export function intentOf(press: KeyPress): Intent | null {
  return hasModifier(press) ? null : (INTENTS[press.key] ?? null);
}

export const isLiftKey = (press: KeyPress) =>
  !hasModifier(press) && (press.key === 'Enter' || press.key === ' ');

/** Ctrl or Cmd with Z undoes; with Shift and Z, or with Y, redoes. */
export function undoKeyOf(press: KeyPress): 'undo' | 'redo' | null {
  if (press.altKey || press.ctrlKey === press.metaKey) return null;
  const key = press.key.toLowerCase();
  if (key === 'z') return press.shiftKey ? 'redo' : 'undo';
  return key === 'y' && press.ctrlKey && !press.shiftKey ? 'redo' : null;
}

/** How the keys are told beside the list of places. */
export const KEY_LEGEND: readonly { keys: string[]; does: string }[] = [
  { keys: ['←', '→'], does: 'along the shelves' },
  { keys: ['↑', '↓'], does: 'along this list' },
  { keys: ['Home'], does: 'best gap' },
  { keys: ['Enter'], does: 'put down' },
  { keys: ['Esc'], does: 'put back' },
];
