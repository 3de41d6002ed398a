/** Every single key that does something, in the order in which they are told. */
export const SHORTCUTS = {
  find: { key: '/', does: 'Find a batch or a shelf by its name', where: 'everywhere' },
  keys: { key: '?', does: 'Show these keys', where: 'everywhere' },
  board: { key: 'b', does: 'Go to the board', where: 'everywhere' },
  record: { key: 'r', does: 'Go to the record', where: 'everywhere' },
  'new-batch': { key: 'n', does: 'New batch', where: 'board' },
  'new-shelf': { key: 's', does: 'New shelf', where: 'board' },
  filter: { key: 'f', does: 'Open the filter', where: 'board' },
  'show-all': { key: 'x', does: 'Clear the filter', where: 'board' },
} as const;
export type ShortcutName = keyof typeof SHORTCUTS;

interface KeyPress {
  key: string;
  ctrlKey: boolean;
  metaKey: boolean;
  altKey: boolean;
  repeat: boolean;
}

/** Keys with Ctrl, Alt or Cmd are the browser's and the screen reader's. */
export function shortcutOf(press: KeyPress): ShortcutName | null {
  if (press.ctrlKey || press.metaKey || press.altKey || press.repeat) return null;
  const names = Object.keys(SHORTCUTS) as ShortcutName[];
  return names.find((name) => SHORTCUTS[name].key === press.key) ?? null;
}
