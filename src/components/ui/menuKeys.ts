import type { KeyboardEvent } from 'react';

const itemsOf = (menu: Element) => [...menu.querySelectorAll<HTMLElement>('[role=menuitem]')];

/** Moves the focus to an item; past an end it goes round. */
export function focusItem(menu: Element, at: number) {
  const items = itemsOf(menu);
  items.at(at % Math.max(1, items.length))?.focus();
}

/** The next item that begins with a letter, after the one with the focus. */
function focusLetter(menu: Element, letter: string) {
  const items = itemsOf(menu);
  const here = items.findIndex((item) => item === document.activeElement);
  const onward = [...items.slice(here + 1), ...items.slice(0, here + 1)];
  onward.find((item) => item.textContent?.trim().toLowerCase().startsWith(letter))?.focus();
}

/** The keys of a menu: arrows, Home, End, first letters; Escape and Tab close it. */
export function onMenuKey(event: KeyboardEvent<HTMLElement>, close: () => void) {
  const menu = event.currentTarget;
  const here = itemsOf(menu).findIndex((item) => item === document.activeElement);
  // From the button, to which the focus goes back, Tab goes on by itself.
  if (event.key === 'Tab') return close();
  const go = () => {
    if (event.key === 'ArrowDown') return focusItem(menu, here + 1);
    if (event.key === 'ArrowUp') return focusItem(menu, here === -1 ? -1 : here - 1);
    if (event.key === 'Home') return focusItem(menu, 0);
    if (event.key === 'End') return focusItem(menu, -1);
    if (event.key === 'Escape') return close();
    if (event.key === ' ' && document.activeElement instanceof HTMLAnchorElement)
      return document.activeElement.click();
    return 'other';
  };
  if (go() === undefined) {
    event.preventDefault();
    event.stopPropagation();
    return;
  }
  const isLetter = event.key.length === 1 && event.key !== ' ';
  if (isLetter && !event.ctrlKey && !event.metaKey && !event.altKey)
    focusLetter(menu, event.key.toLowerCase());
}
