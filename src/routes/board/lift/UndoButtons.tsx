import { Redo2, Undo2, type LucideIcon } from 'lucide-react';
import { useBoard } from '../../../api/board.ts';
import { useOnline } from '../../../app/useOnline.ts';
import { OFFLINE_WORDS } from './failure.ts';
import { useLiftMachine } from './liftContext.ts';

/** Undo and redo of one's own changes; the keys do the same (Ctrl or Cmd with Z). */
export function UndoButtons() {
  const { me, undo, redo } = useBoard();
  const { putting } = useLiftMachine();
  if (!me.can.moveBatches) return null;
  return (
    <div className="flex gap-1">
      <TurnButton name="Undo" icon={Undo2} what={undo?.what} onClick={putting.undo} keys="Ctrl Z" />
      <TurnButton
        name="Redo"
        icon={Redo2}
        what={redo?.what}
        onClick={putting.redo}
        keys="Ctrl Shift Z"
      />
    </div>
  );
}

interface TurnButtonProps {
  name: string;
  icon: LucideIcon;
  /** The change that it would undo or do again; absent: there is none. */
  what: string | undefined;
  keys: string;
  onClick: () => void;
}

function TurnButton({ name, icon: Icon, what, keys, onClick }: TurnButtonProps) {
  const online = useOnline();
  const why = online ? null : OFFLINE_WORDS;
  const label = what ? `${name}: ${what}` : `${name}: nothing of yours to ${name.toLowerCase()}`;
  const isOff = why !== null || what === undefined;
  return (
    <button
      type="button"
      aria-label={why ? `${name}: ${why}` : label}
      aria-disabled={isOff}
      title={why ?? `${label} (${keys})`}
      onClick={() => !isOff && onClick()}
      className="grid size-9 place-items-center rounded-button border-[1.5px] border-edge bg-white text-ink not-aria-disabled:hover:bg-bottle-l aria-disabled:border-line aria-disabled:bg-line2 aria-disabled:text-ink3/60 max-tablet:size-11"
    >
      <Icon size={18} aria-hidden />
    </button>
  );
}
