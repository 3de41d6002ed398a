import { memo, useEffect, useRef } from 'react';
import type { VesselShape } from '#shared/api/vessel.ts';
import { BarFace } from './BarFace.tsx';
import { GapFace } from './GapFace.tsx';
import { useLiftMachine, useLiftState } from './liftContext.ts';
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
function useInSight(isOver: boolean) {
  const { store } = useLiftMachine();
  const ref = useRef<HTMLDivElement | null>(null);
  useEffect(() => {
    if (isOver && store.get().lifted?.by === 'keys')
      ref.current?.scrollIntoView({ block: 'nearest', inline: 'nearest' });
  }, [isOver, store]);
  return ref;
}

/**
 * A place between two batches. It fills the room that the board keeps for it, is nothing while no
 * batch is lifted, and is drawn anew only when its own judgement or its own turn comes.
 */
export const GapSlot = memo(function GapSlot({ gapKey, vesselShape, layout }: GapSlotProps) {
  const gap = useLiftState(({ lifted, opened, over }) =>
    opened.has(gapKey) || over === gapKey ? lifted?.gaps.get(gapKey) : undefined,
  );
  const locked = useLiftState(({ lifted }) => lifted?.locks.get(gapKey));
  const isOver = useLiftState((state) => state.over === gapKey);
  const shape = useLiftState(({ lifted }) => lifted?.shape) ?? vesselShape;
  const ref = useInSight(isOver);
  const isBar = layout === 'bar' || gapKey === 'bench';
  return (
    <div
      ref={ref}
      className="absolute inset-0 scroll-mx-12 scroll-mt-20 scroll-mb-32"
      data-gap={gapKey}
      data-gap-open={gap && isOpen(gap) ? gapKey : undefined}
    >
      {gap?.locked && <LockedFace words={locked ?? ''} isBar={isBar} />}
      {gap?.here && gap.best && <HereFace />}
      {gap && isOpen(gap) && isBar && <BarFace gap={gap} isOver={isOver} />}
      {gap && isOpen(gap) && !isBar && <GapFace gap={gap} isOver={isOver} shape={shape} />}
    </div>
  );
});
