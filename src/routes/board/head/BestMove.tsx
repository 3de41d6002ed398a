import { Button } from '../../../components/ui/Button.tsx';
import { usePut } from '../lift/usePut.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { useBestMove } from './useBestMove.ts';

/**
 * The move that would help most, as a quiet line with the button that makes it. Its room is kept
 * while it is weighed, so that nothing slips from under the pointer when it comes.
 */
export function BestMove() {
  const { judged } = useBoardView();
  const move = useBestMove();
  const put = usePut();
  if (judged.totals.hold + judged.totals.mind === 0) return null;
  return (
    <div className="flex min-h-9 basis-full print:hidden items-center gap-3 text-small text-ink2">
      {move === null && <p>No move of a single batch would leave fewer holds or minds.</p>}
      {move !== null && move !== 'weighing' && (
        <>
          <p className="min-w-0">
            <b className="text-ink">The move that would help most:</b>{' '}
            {move.what.replace(/^Move /, '')}
          </p>
          <Button size="small" look="quiet" onClick={() => put(move.batchId, move.gap)}>
            Move it
          </Button>
        </>
      )}
    </div>
  );
}
