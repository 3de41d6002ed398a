import { useEffect, useRef } from 'react';
import { useLocation } from 'react-router-dom';

/** Frames to wait for a page whose data is still on its way. */
const PATIENCE = 300;

/** After a change of page the keyboard and the screen reader start at its heading. */
export function FocusOnNavigation() {
  const { pathname } = useLocation();
  const before = useRef(pathname);
  useEffect(() => {
    if (before.current === pathname) return;
    before.current = pathname;
    window.scrollTo(0, 0);
    return focusHeading();
  }, [pathname]);
  return null;
}

function focusHeading() {
  let frame = 0;
  let left = PATIENCE;
  const look = () => {
    const heading = document.querySelector<HTMLElement>('main h1');
    if (!heading) {
      left -= 1;
      if (left > 0) frame = requestAnimationFrame(look);
      return;
    }
    // Whoever has put the focus somewhere since keeps it there.
    if (document.activeElement !== document.body && document.activeElement?.closest('main')) return;
    heading.setAttribute('tabindex', '-1');
    heading.focus({ preventScroll: true });
  };
  frame = requestAnimationFrame(look);
  return () => cancelAnimationFrame(frame);
}
