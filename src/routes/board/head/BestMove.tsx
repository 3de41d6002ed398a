import { Button } from '../../../components/ui/Button.tsx';
import { usePut } from '../lift/usePut.ts';
import { useBestMove } from './useBestMove.ts';

/** The move that would help most, as a quiet line with the button that makes it. */
export function BestMove() {
  const move = useBestMove();
  const put = usePut();
  if (!move) return null;
  return (
    <p className="flex basis-full items-center gap-3 text-small text-ink2">
      <span className="min-w-0">
        <b className="text-ink">The move that would help most:</b> {move.what.replace(/^Move /, '')}
      </span>
      <Button size="small" look="quiet" onClick={() => put(move.batchId, move.gap)}>
        Move it
      </Button>
    </p>
  );
}
