import { ArrowRightLeft } from 'lucide-react';
import { memo } from 'react';
import { useLiftMachine, useLiftState } from './liftContext.ts';
import { useMovable } from './LiftHandle.tsx';

/** Opens the list of every place for a batch: the way to move it without dragging. */
export const MoveMenu = memo(function MoveMenu({ batchId }: { batchId: string }) {
  const { name, mayMove, why } = useMovable(batchId);
  const { store } = useLiftMachine();
  const isOpen = useLiftState((state) => state.placesFor === batchId);
  if (!mayMove) return null;
  return (
    <button
      type="button"
      aria-haspopup="dialog"
      aria-expanded={isOpen}
      aria-disabled={why !== null}
      aria-label={why ? `Move ${name}: not possible. ${why}.` : `Move ${name}`}
      title={why ?? `Move ${name}`}
      onClick={() => !why && store.set({ placesFor: batchId })}
      className="grid size-7 shrink-0 place-items-center rounded-lg text-ink2 not-aria-disabled:hover:bg-line2 aria-disabled:opacity-35 max-tablet:size-11"
    >
      <ArrowRightLeft size={16} aria-hidden />
    </button>
  );
});
