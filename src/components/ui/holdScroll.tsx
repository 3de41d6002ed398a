import { useEffect, type ElementType, type ReactNode } from 'react';

interface RemoveScrollProps {
  as: ElementType;
  allowPinchZoom?: boolean;
  shards?: unknown;
  children?: ReactNode;
}

let holders = 0;

function hold() {
  const { documentElement: page } = document;
  const hasScrollbar = window.innerWidth > page.clientWidth;
  holders += 1;
  if (holders === 1) page.dataset.held = hasScrollbar ? 'gutter' : '';
  return () => {
    holders -= 1;
    if (holders === 0) delete page.dataset.held;
  };
}

/**
 * Keeps the page behind a dialog still, by an attribute that styles.css knows. It stands in for the
 * package of this name under radix-ui (vite.config.ts), which writes an inline style to the same
 * end: the content policy forbids those.
 */
export function RemoveScroll({ as: Wrapper, children }: RemoveScrollProps) {
  useEffect(hold, []);
  return <Wrapper>{children}</Wrapper>;
}
