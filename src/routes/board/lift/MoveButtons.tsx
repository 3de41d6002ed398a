import { ChevronDown, ChevronUp, type LucideIcon } from 'lucide-react';
import { memo } from 'react';
import { useBoard } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { OFFLINE_WORDS } from './failure.ts';
import { useLiftMachine } from './liftContext.ts';
import { useMovable } from './LiftHandle.tsx';
import { judgedPlaces } from './judging.ts';
import { neighbours, type Neighbour } from './neighbours.ts';

/** One step earlier or later on the shelf, for a thumb. */
export const MoveButtons = memo(function MoveButtons({ batchId }: { batchId: string }) {
  const board = useBoard();
  const { name, mayMove } = useMovable(batchId);
  const { putting } = useLiftMachine();
  if (!mayMove) return null;
  const { earlier, later } = neighbours(board, batchId);
  const go = (key: string) => {
    const gap = judgedPlaces(board, batchId).gaps.get(key);
    if (gap) putting.put(batchId, gap);
  };
  return (
    <span className="inline-flex shrink-0 overflow-hidden rounded-field border-[1.5px] border-edge bg-white">
      <StepButton {...{ name, go }} to={earlier} word="earlier" icon={ChevronUp} />
      <span aria-hidden className="w-[1.5px] bg-line" />
      <StepButton {...{ name, go }} to={later} word="later" icon={ChevronDown} />
    </span>
  );
});

interface StepButtonProps {
  name: string;
  word: 'earlier' | 'later';
  icon: LucideIcon;
  to: Neighbour;
  go: (key: string) => void;
}

/** A disabled step keeps its place and says in its name why it is not possible. */
function StepButton({ name, word, icon: Icon, to, go }: StepButtonProps) {
  const online = useOnline();
  const why = online ? to.why : OFFLINE_WORDS;
  return (
    <button
      type="button"
      aria-label={why ? `Move ${name} ${word}: not possible. ${why}.` : `Move ${name} ${word}`}
      aria-disabled={why !== null}
      title={why ?? `Move ${name} ${word}`}
      onClick={() => !why && to.key !== null && go(to.key)}
      className="grid h-11 w-[46px] place-items-center -outline-offset-3 aria-disabled:bg-line2 aria-disabled:text-ink3/50 not-aria-disabled:active:bg-bottle-l"
    >
      <Icon size={20} strokeWidth={2.2} aria-hidden />
    </button>
  );
}
