import { Button } from './Button.tsx';
import { ModalCard } from './ModalCard.tsx';

/** Asked before something typed is lost. */
export function LeaveDialog({ onStay, onLeave }: { onStay: () => void; onLeave: () => void }) {
  return (
    <ModalCard onLeave={onStay} title="Leave without saving?" lead="What you typed is not saved.">
      <div className="flex flex-wrap justify-end gap-3">
        <Button look="danger" onClick={onLeave}>
          Leave without saving
        </Button>
        <Button look="first" onClick={onStay}>
          Go on writing
        </Button>
      </div>
    </ModalCard>
  );
}
