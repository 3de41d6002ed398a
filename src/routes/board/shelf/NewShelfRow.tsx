import { GapSlot } from '../lift/GapSlot.tsx';
import { SHELF, SHELF_HEIGHT } from '../view/drawing.ts';

/** The room under the last shelf in which a new one can be begun; only there while a batch is lifted. */
export function NewShelfRow() {
  return (
    <section
      data-room
      aria-label="New shelf"
      className="hidden grid-cols-[148px_minmax(0,1fr)] data-lifting:grid"
    >
      <p className="pt-3 font-display text-shelf font-[680] tracking-[-0.02em] text-ink2">
        New shelf
      </p>
      <div className="relative -ml-10" style={{ height: SHELF_HEIGHT }}>
        <div
          aria-hidden
          className="absolute right-0 left-10 border-t-2 border-dashed border-edge"
          style={{ top: SHELF.top }}
        />
        <div className="absolute inset-y-0 left-11" style={{ width: SHELF.gap }}>
          <GapSlot gapKey="new" chainId="new" afterBatchId={null} vesselShape="bucket" />
        </div>
      </div>
    </section>
  );
}
