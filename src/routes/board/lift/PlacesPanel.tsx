import { useCallback } from 'react';
import type { Gap } from '#shared/chain/gaps.ts';
import { useBoard } from '../../../api/board.ts';
import { KEY_LEGEND } from './keys.ts';
import { drop, useLiftMachine, useLiftState } from './liftContext.ts';
import { PlacesList } from './PlacesList.tsx';
import { PlacesLead } from './PlacesLead.tsx';

/** The panel beside the board while a batch is lifted. */
export function PlacesPanel() {
  const board = useBoard();
  const machine = useLiftMachine();
  const lifted = useLiftState((state) => state.lifted);
  const over = useLiftState((state) => state.over);
  const onPut = useCallback((gap: Gap) => drop(machine, gap.key), [machine]);
  if (!lifted) return null;
  const { batchId, ranked, by } = lifted;
  return (
    <section aria-label={`Where ${lifted.name} can go`} className="flex flex-col">
      <h2 className="text-h2 [overflow-wrap:anywhere]">Where {lifted.name} can go</h2>
      <PlacesLead batchId={batchId} />
      {by === 'keys' && <KeyLegend />}
      <div className="mt-3.5">
        <PlacesList {...{ board, batchId, ranked, over, onPut }} follow={by === 'keys'} />
      </div>
      <HoldsCanBeChosen />
    </section>
  );
}

function KeyLegend() {
  return (
    <dl className="mt-3 flex flex-wrap gap-x-4 gap-y-1.5 text-small text-ink2">
      {KEY_LEGEND.map(({ keys, does }) => (
        <div key={does} className="flex items-center gap-1.5 whitespace-nowrap">
          <dt className="flex gap-1">
            {keys.map((key) => (
              <kbd
                key={key}
                className="rounded-md border-[1.5px] border-edge bg-white px-1.5 font-sans text-label font-semibold text-ink"
              >
                {key}
              </kbd>
            ))}
          </dt>
          <dd>{does}</dd>
        </div>
      ))}
    </dl>
  );
}

/** What may be done about a hold; under every list of places. */
export const HoldsCanBeChosen = () => (
  <p className="mt-4 border-t border-line pt-3 text-small text-ink2">
    Holds can still be chosen. To accept one, the head brewer gives a reason, and it stays on the
    record; never for an allergen, a wild culture or an overfull vessel.
  </p>
);
