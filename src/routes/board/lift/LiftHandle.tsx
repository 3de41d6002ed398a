import { GripVertical } from 'lucide-react';
import { memo, type KeyboardEvent } from 'react';
import { useBoardView } from '../view/BoardView.tsx';
import { OFFLINE_WORDS } from './failure.ts';
import { isLiftKey } from './keys.ts';
import { useIsLifted, useLiftMachine } from './liftContext.ts';
import { whyBatchFixed } from './lifting.ts';

/** Why a batch stays where it is, and its name; for handles, move buttons and menus. */
export function useMovable(batchId: string) {
  const { board, index, online } = useBoardView();
  const batch = index.batch(batchId);
  return {
    name: batch?.name ?? '',
    mayMove: board.me.can.moveBatches,
    why: whyBatchFixed(board, batch) ?? (online ? null : OFFLINE_WORDS),
  };
}

/**
 * What a batch is lifted by: dragged with mouse or finger, or with Enter or Space. A plain click or
 * tap (also a screen reader's) opens the list of places.
 */
export const LiftHandle = memo(function LiftHandle({ batchId }: { batchId: string }) {
  const { name, mayMove, why } = useMovable(batchId);
  const { store, lifting } = useLiftMachine();
  const isLifted = useIsLifted(batchId);
  if (!mayMove) return null;
  const onKeyDown = (event: KeyboardEvent) => {
    if (!isLiftKey(event) || event.repeat) return;
    event.preventDefault();
    if (!isLifted) lifting.lift(batchId, 'keys');
  };
  return (
    <button
      type="button"
      data-lift-handle={batchId}
      aria-label={why ? `Lift ${name}: not possible. ${why}.` : `Lift ${name}`}
      aria-disabled={why !== null}
      aria-pressed={isLifted}
      title={why ?? `Drag ${name}, or press Enter to lift it`}
      onKeyDown={onKeyDown}
      onKeyUp={(event) => event.key === ' ' && event.preventDefault()}
      onClick={() => !why && !isLifted && store.set({ placesFor: batchId })}
      className="grid size-7 shrink-0 touch-none place-items-center rounded-lg text-ink2 not-aria-disabled:cursor-grab not-aria-disabled:hover:bg-line2 aria-disabled:opacity-35 aria-pressed:bg-bottle aria-pressed:text-on-bottle max-tablet:size-11"
    >
      <GripVertical size={18} aria-hidden />
    </button>
  );
});
