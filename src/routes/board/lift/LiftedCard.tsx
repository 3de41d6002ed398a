import { useBoard } from '../../../api/board.ts';
import { useUnits } from '../../../app/useUnits.ts';
import { Swatch } from '../../../components/drawn/Swatch.tsx';
import { Vessel } from '../../../components/drawn/Vessel.tsx';
import { beerFacts, volumeOf } from '../view/words.ts';
import { useLiftState } from './liftContext.ts';

/** The batch in the hand: its vessel without a cake, its name and figures. */
export function LiftedCard() {
  const board = useBoard();
  const units = useUnits();
  const lifted = useLiftState((state) => state.lifted);
  const batch = board.batches.find((row) => row.id === lifted?.batchId);
  if (!batch || lifted?.by !== 'pointer') return null;
  const { gravity, rest } = beerFacts(batch, units);
  return (
    <div
      aria-hidden
      className="lifted-card will-change-transform flex w-[214px] cursor-grabbing items-end gap-3 rounded-card border-2 border-ink bg-white p-3 pr-4 shadow-lifted"
    >
      {lifted.shape && volumeOf(batch) !== null ? (
        <Vessel
          {...{ shape: lifted.shape, srm: batch.srm, fill: 0.72, cake: null }}
          stage="racked"
          width={48}
        />
      ) : (
        <Swatch srm={batch.srm} size="glass" />
      )}
      <span className="min-w-0">
        <b className="line-clamp-2 font-display text-shelf leading-[1.1]">{batch.name}</b>
        <span className="block truncate text-small text-ink2">{batch.style}</span>
        <span className="block truncate text-small text-ink2">
          <b className="text-ink">{gravity}</b> · {rest[0]}
        </span>
      </span>
    </div>
  );
}
