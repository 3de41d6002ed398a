import { Suspense } from 'react';
import { useShortcut } from '../../keys/useShortcut.ts';
import { useTitle } from '../../app/useTitle.ts';
import { BoardForms } from './BoardForms.tsx';
import { EmptyBoard } from './empty/EmptyBoard.tsx';
import { FilterPart } from './finding/FindTools.tsx';
import { MatchingProvider } from './finding/Matching.tsx';
import { useArrival } from './finding/useArrival.ts';
import { BoardHead } from './head/BoardHead.tsx';
import { SeasonNote } from './head/SeasonNote.tsx';
import { LiftProvider } from './lift/LiftProvider.tsx';
import { SidePanel } from './panel/SidePanel.tsx';
import { PhoneBoard } from './phone/PhoneBoard.tsx';
import { Bench } from './shelf/Bench.tsx';
import { Shelves } from './shelf/Shelves.tsx';
import { BoardFault } from './states/BoardFault.tsx';
import { BoardSkeleton } from './states/BoardSkeleton.tsx';
import { BoardViewProvider, useBoardView } from './view/BoardView.tsx';
import { useBoardPanel } from './view/useBoardPanel.ts';
import { usePhone } from './view/useMedia.ts';

/** The season's board: shelves, bench, and what is opened beside them. */
export function BoardPage() {
  useTitle('Board');
  return (
    <BoardFault>
      <Suspense fallback={<BoardSkeleton />}>
        <BoardViewProvider>
          <OpenBoard />
        </BoardViewProvider>
      </Suspense>
    </BoardFault>
  );
}

function OpenBoard() {
  const { board, can } = useBoardView();
  const { open } = useBoardPanel();
  useShortcut('new-batch', () => open({ kind: 'new', what: 'batch' }), can.editBatches);
  useShortcut('new-shelf', () => open({ kind: 'new', what: 'chain' }), can.editChains);
  const phone = usePhone();
  const isEmpty =
    board.chains.length === 0 && board.batches.length === 0 && board.guests.length === 0;
  if (isEmpty)
    return (
      <>
        <EmptyBoard />
        <BoardForms />
      </>
    );
  return (
    <LiftProvider>
      <MatchingProvider>{phone ? <PhoneBoard /> : <ShelfBoard />}</MatchingProvider>
      <BoardForms />
    </LiftProvider>
  );
}

function ShelfBoard() {
  useArrival();
  return (
    <div className="flex min-w-0 grow">
      <main id="main" className="flex min-w-0 flex-1 flex-col outline-none">
        <SeasonNote />
        <BoardHead />
        <FilterPart />
        <Shelves />
        <Bench />
      </main>
      <SidePanel />
    </div>
  );
}
