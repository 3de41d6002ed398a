import { memo } from 'react';
import { Lock } from '../../../components/drawn/Lock.tsx';

interface LockedFaceProps {
  words: string;
  isBar: boolean;
}

/** A place that stays shut: the cake there is poured already, or it would be its own. */
export const LockedFace = memo(function LockedFace({ words, isBar }: LockedFaceProps) {
  if (isBar)
    return (
      <div className="gap-open absolute inset-0 flex items-center gap-2 rounded-xl bg-stone px-3 text-small text-ink2">
        <Lock size={15} /> {words}
      </div>
    );
  return (
    <div className="gap-open absolute inset-x-6 top-16 grid justify-items-center gap-1 text-center text-label leading-[1.2] text-ink2">
      <Lock size={15} />
      {words}
    </div>
  );
});

/** Said at the batch's own place where no other is better. */
export const HereFace = () => (
  <p className="gap-open absolute inset-x-4 top-10 rounded-card border-2 border-bottle bg-bottle-l px-2 py-1.5 text-center text-label leading-[1.2] font-bold text-bottle">
    Best gap: where it is now
  </p>
);
