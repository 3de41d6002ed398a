import { scrollAt } from './autoScroll.ts';
import { gapIn, type Point } from './pointer.ts';

export interface Watch {
  /** Ends the watch; the answer is the gap under the pointer at the end. */
  stop(): string | null;
}

const under = ({ x, y }: Point) => document.elementFromPoint(x, y);

/**
 * Follows the pointer of a drag: one hit test in a frame, none while neither the pointer nor what
 * lies under it moves.
 */
export function watchPointer(first: Event, goOver: (key: string | null) => void): Watch {
  const at: Point = { x: 0, y: 0 };
  let hasMoved = true;
  const follow = (event: Event) => {
    if (!(event instanceof PointerEvent)) return;
    at.x = event.clientX;
    at.y = event.clientY;
    hasMoved = true;
  };
  const look = () => {
    if (hasMoved) {
      const element = under(at);
      goOver(gapIn(element));
      hasMoved = scrollAt(at, element);
    }
    frame = requestAnimationFrame(look);
  };
  follow(first);
  document.addEventListener('pointermove', follow, true);
  let frame = requestAnimationFrame(look);
  return {
    stop() {
      cancelAnimationFrame(frame);
      document.removeEventListener('pointermove', follow, true);
      return gapIn(under(at));
    },
  };
}
