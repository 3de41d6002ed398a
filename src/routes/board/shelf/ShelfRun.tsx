import type { ReactNode } from 'react';
import { useHiddenEdges } from '../../../app/useHiddenEdges.ts';
import { SHELF, SHELF_HEIGHT } from '../view/drawing.ts';

/**
 * The shelf's board with what stands on it. Longer than the page is wide, it scrolls inside itself
 * and fades where it goes on. The room before the first vessel lets its lamp shine past the edge.
 */
export function ShelfRun({ label, children }: { label: string; children: ReactNode }) {
  const ref = useHiddenEdges();
  return (
    <div
      ref={ref}
      data-run
      className="shelf-run thumb-slim relative -mt-4 -ml-10 pt-4 overflow-x-auto overflow-y-hidden overscroll-x-contain"
    >
      <div
        className="relative w-max min-w-full pl-11 print:w-full"
        style={{ minHeight: SHELF_HEIGHT }}
      >
        <div
          aria-hidden
          className="shelf-line absolute right-0 left-10 print:hidden"
          style={{ top: SHELF.top, height: SHELF.board }}
        />
        <ol aria-label={label} className="flex print:flex-wrap">
          {children}
        </ol>
      </div>
    </div>
  );
}
