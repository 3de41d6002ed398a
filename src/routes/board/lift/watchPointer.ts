import { scrollAt } from './autoScroll.ts';
import { gapIn, pointOf, type Point } from './pointer.ts';

export interface Watch {
  moved(event: PointerEvent): void;
  /** Ends the watch; the answer is the gap under the pointer at the end. */
  stop(): string | null;
}

const under = ({ x, y }: Point) => document.elementFromPoint(x, y);

interface Steps {
  carry(at: Point): void;
  goOver(key: string | null): void;
}

/**
 * Follows the pointer of a drag, once in a frame. What lies under a mouse the browser has found out
 * to send its event; only a finger, or what scrolls under the pointer, needs a hit test of ours.
 */
export function watchPointer(start: Point, { carry, goOver }: Steps): Watch {
  let at = start;
  let target: Element | null = null;
  let hasMoved = true;
  let hasScrolled = false;
  const look = () => {
    if (hasMoved || hasScrolled) {
      const element = (!hasScrolled && target) || under(at);
      if (hasMoved) carry(at);
      hasMoved = false;
      goOver(gapIn(element));
      hasScrolled = scrollAt(at, element);
    }
    frame = requestAnimationFrame(look);
  };
  let frame = requestAnimationFrame(look);
  carry(start);
  return {
    moved(event) {
      at = pointOf(event);
      // A finger's events go to where it was put down.
      const isMouse = event.pointerType === 'mouse' && event.target instanceof Element;
      target = isMouse ? event.target : null;
      hasMoved = true;
    },
    stop() {
      cancelAnimationFrame(frame);
      return gapIn(under(at));
    },
  };
}
