import { Suspense } from 'react';
import { useParams } from 'react-router-dom';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardSkeleton } from '../board/states/BoardSkeleton.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { Page } from '../shell/Page.tsx';
import { OpenedPour } from './OpenedPour.tsx';

/** Brew day at the vessel: may the wort go onto the cake, and what was done. */
export function PourPage() {
  return (
    <BoardFault>
      <Suspense fallback={<BoardSkeleton />}>
        <BoardViewProvider>
          <FoundBatch />
        </BoardViewProvider>
      </Suspense>
    </BoardFault>
  );
}

function FoundBatch() {
  const { laterBatchId = '' } = useParams();
  const { index } = useBoardView();
  const { path } = useBrewery();
  const batch = index.batch(laterBatchId.toLowerCase());
  useTitle(batch ? `Pour ${batch.name}` : 'No such batch');
  if (batch && batch.chainId !== null) return <OpenedPour key={batch.id} batch={batch} />;
  return (
    <Page>
      <h1 className="text-h1">
        {batch ? `${batch.name} stands on no shelf` : 'This batch is not on the board'}
      </h1>
      <p className="mt-2 text-ink2">
        {batch
          ? 'Put it on a shelf first: then it is known which cake its wort goes onto.'
          : 'Somebody deleted it, or it is of another season.'}{' '}
        <TextLink to={path()}>Go to the board</TextLink>
      </p>
    </Page>
  );
}
