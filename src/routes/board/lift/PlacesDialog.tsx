import { useMemo } from 'react';
import { useBoard } from '../../../api/board.ts';
import { Dialog } from '../../../components/ui/Dialog.tsx';
import { judgedPlaces } from './judging.ts';
import { useLiftMachine, useLiftState } from './liftContext.ts';
import { PlacesLead } from './PlacesLead.tsx';
import { PlacesList } from './PlacesList.tsx';
import { HoldsCanBeChosen } from './PlacesPanel.tsx';
import { batchName } from './words.ts';

/** The list of places for a batch that is not lifted: its Move menu. */
export function PlacesDialog() {
  const batchId = useLiftState((state) => state.placesFor);
  return batchId === null ? null : <PlacesFor batchId={batchId} />;
}

function PlacesFor({ batchId }: { batchId: string }) {
  const board = useBoard();
  const { store, putting } = useLiftMachine();
  const { ranked } = useMemo(() => judgedPlaces(board, batchId), [board, batchId]);
  return (
    <Dialog
      open
      onClose={() => store.set({ placesFor: null })}
      title={`Where ${batchName(board, batchId)} can go`}
      lead={<PlacesLead batchId={batchId} />}
    >
      <PlacesList
        {...{ board, batchId, ranked }}
        over={null}
        onPut={(gap) => {
          store.set({ placesFor: null });
          putting.put(batchId, gap);
        }}
      />
      <HoldsCanBeChosen />
    </Dialog>
  );
}
