import { useEffect, useLayoutEffect, useRef, type RefObject } from 'react';
import { focusItem } from './menuKeys.ts';

const GAP = 6;
const MARGIN = 8;

interface MenuPlace {
  opener: RefObject<HTMLButtonElement | null>;
  align: 'start' | 'end';
  byKeys: boolean;
  close: () => void;
}

/** Puts a menu under its button, or over it where there is more room, and within the window. */
function put(menu: HTMLElement, opener: HTMLElement, align: 'start' | 'end') {
  const button = opener.getBoundingClientRect();
  const below = window.innerHeight - button.bottom - GAP - MARGIN;
  const above = button.top - GAP - MARGIN;
  const { offsetWidth: width, scrollHeight } = menu;
  const isBelow = scrollHeight <= below || below >= above;
  const left = align === 'start' ? button.left : button.right - width;
  const most = document.documentElement.clientWidth - width - MARGIN;
  menu.style.maxHeight = `${Math.round(isBelow ? below : above)}px`;
  menu.style.left = `${Math.round(Math.max(MARGIN, Math.min(left, most)))}px`;
  menu.style.top = isBelow ? `${Math.round(button.bottom + GAP)}px` : 'auto';
  menu.style.bottom = isBelow ? 'auto' : `${Math.round(window.innerHeight - button.top + GAP)}px`;
}

/** Shows a menu in the top layer beside its button, and closes it by a press anywhere else. */
export function useMenuPlace({ opener, align, byKeys, close }: MenuPlace) {
  const menu = useRef<HTMLDivElement>(null);
  const closing = useRef(close);
  useEffect(() => {
    closing.current = close;
  });
  useLayoutEffect(() => {
    const { current: opened } = menu;
    const { current: button } = opener;
    if (!opened || !button) return;
    const replace = () => put(opened, button, align);
    opened.showPopover();
    replace();
    if (byKeys) focusItem(opened, 0);
    else opened.focus({ preventScroll: true });
    const isOutside = (target: EventTarget | null) =>
      target instanceof Node && !opened.contains(target) && !button.contains(target);
    const onPress = (event: PointerEvent) => isOutside(event.target) && closing.current();
    document.addEventListener('pointerdown', onPress, true);
    window.addEventListener('scroll', replace, true);
    window.addEventListener('resize', replace);
    return () => {
      document.removeEventListener('pointerdown', onPress, true);
      window.removeEventListener('scroll', replace, true);
      window.removeEventListener('resize', replace);
    };
  }, [opener, align, byKeys]);
  return menu;
}
