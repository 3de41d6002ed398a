import { memo, useEffect, useLayoutEffect, useRef, type RefObject } from 'react';
import type { VesselShape } from '#shared/api/vessel.ts';
import { BarFace } from './BarFace.tsx';
import { GapFace } from './GapFace.tsx';
import { useLiftMachine, useLiftStateOf } from './liftContext.ts';
import { HereFace, LockedFace } from './LockedFace.tsx';
import { isOpen } from './places.ts';

interface GapSlotProps {
  /** `chainId:afterBatchId`, `chainId:first`, `new` or `bench`. */
  gapKey: string;
  chainId?: string;
  afterBatchId?: string | null;
  /** The vessel of the shelf; the batch's own goes before it. */
  vesselShape: VesselShape;
  /** `shelf`: a silhouette that stands on the shelf; `bar`: a line of words, for a phone. */
  layout?: 'shelf' | 'bar';
}

/** Keys bring the place that they walk to into sight; a pointer scrolls for itself. */
function useInSight(ref: RefObject<HTMLDivElement | null>, isOver: boolean) {
  const { store } = useLiftMachine();
  useEffect(() => {
    if (isOver && store.get().lifted?.by === 'keys')
      ref.current?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  }, [ref, isOver, store]);
}

/**
 * Marks what gives way to the gap while it is open. Written to that element and to no other, so
 * that nothing is drawn anew and little is styled anew.
 */
function useRoom(ref: RefObject<HTMLDivElement | null>, isOpened: boolean) {
  const { store } = useLiftMachine();
  useLayoutEffect(() => {
    const room = isOpened && ref.current?.closest('[data-room]');
    if (!room) return;
    room.setAttribute('data-lifting', store.get().lifted?.by ?? '');
    return () => room.removeAttribute('data-lifting');
  }, [ref, isOpened, store]);
}

/**
 * A place between two batches. It fills the room that the board keeps for it, is nothing while no
 * batch is lifted, and is drawn anew only when its own judgement or its own turn comes.
 */
export const GapSlot = memo(function GapSlot({ gapKey, vesselShape, layout }: GapSlotProps) {
  const face = useLiftStateOf(gapKey, ({ opened }) => opened.get(gapKey));
  const isOver = useLiftStateOf(gapKey, ({ over }) => over === gapKey);
  const ref = useRef<HTMLDivElement | null>(null);
  useInSight(ref, isOver);
  useRoom(ref, face !== undefined);
  const gap = face?.gap;
  const isBar = layout === 'bar' || gapKey === 'bench';
  return (
    <div
      ref={ref}
      className="absolute inset-0 scroll-mx-12 scroll-mt-20 scroll-mb-32"
      data-gap={gapKey}
      data-gap-open={gap && isOpen(gap) ? gapKey : undefined}
    >
      {gap?.locked && <LockedFace words={face?.lock ?? ''} isBar={isBar} />}
      {gap?.here && gap.best && <HereFace />}
      {gap && isOpen(gap) && isBar && <BarFace gap={gap} isOver={isOver} />}
      {gap && isOpen(gap) && !isBar && (
        <GapFace gap={gap} isOver={isOver} shape={face?.shape ?? vesselShape} />
      )}
    </div>
  );
});
