import { scrollAt } from './autoScroll.ts';
import { gapIn, pointOf, type Point } from './pointer.ts';
import { createUnderPointer } from './underPointer.ts';

export interface Watch {
  moved(event: PointerEvent): void;
  /** Ends the watch; the answer is the gap under the pointer at the end. */
  stop(): string | null;
}

interface Steps {
  carry(at: Point): void;
  goOver(key: string | null): void;
  /** Changes whenever a gap opens or closes. */
  opened(): unknown;
}

/** Follows the pointer of a drag, once in a frame. */
export function watchPointer(start: Point, { carry, goOver, opened }: Steps): Watch {
  const under = createUnderPointer(opened);
  let at = start;
  let hasMoved = true;
  const look = () => {
    if (hasMoved) carry(at);
    hasMoved = false;
    const { gap, run } = under.at(at);
    goOver(gap);
    scrollAt(at, run);
    frame = requestAnimationFrame(look);
  };
  let frame = requestAnimationFrame(look);
  document.addEventListener('scroll', under.forget, { capture: true, passive: true });
  carry(start);
  return {
    moved(event) {
      at = pointOf(event);
      hasMoved = true;
    },
    stop() {
      cancelAnimationFrame(frame);
      document.removeEventListener('scroll', under.forget, { capture: true });
      // What is put down goes where the eye sees it, whatever was measured.
      return gapIn(document.elementFromPoint(at.x, at.y));
    },
  };
}
