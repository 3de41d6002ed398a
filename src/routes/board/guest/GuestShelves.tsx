import { Suspense } from 'react';
import { placeOf } from '#shared/api/urls.ts';
import { Skeleton } from '../../../components/ui/Skeleton.tsx';
import { useBoardView } from '../view/BoardView.tsx';
import { GuestFault } from './GuestFault.tsx';
import { GuestShelf } from './GuestShelf.tsx';
import { OtherBoard } from './OtherBoard.tsx';

/** Under one's own shelves: the chains of other breweries on which one is a guest. */
export function GuestShelves() {
  const { board, slug } = useBoardView();
  return board.guests.map((guest) => (
    <GuestFault key={guest.guestId} name={guest.chainName} slug={slug}>
      <Suspense fallback={<Skeleton rows={1} label={`Loading ${guest.chainName}`} />}>
        <OtherBoard slug={placeOf(guest.ownerSlug, guest.seasonId)}>
          <GuestShelf guest={guest} />
        </OtherBoard>
      </Suspense>
    </GuestFault>
  ));
}
