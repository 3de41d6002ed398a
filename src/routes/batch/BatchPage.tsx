import { Suspense } from 'react';
import { useParams } from 'react-router-dom';
import type { Batch } from '#shared/api/batch.ts';
import { sentenceOf } from '../../api/errors.ts';
import { useBatchRecord } from '../../api/batchRecord.ts';
import { KeptOffline } from '../../app/keptOffline.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BoardForms } from '../board/BoardForms.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardSkeleton } from '../board/states/BoardSkeleton.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { Page } from '../shell/Page.tsx';
import { CakeCheckPanel } from './check/CakeCheckPanel.tsx';
import { HistoryCard } from './HistoryCard.tsx';
import { EventsCard } from './notes/EventsCard.tsx';
import { NotesCard } from './notes/NotesCard.tsx';
import { PlannedAndRead } from './PlannedAndRead.tsx';
import { FermentationCard } from './plot/FermentationCard.tsx';
import { ReadingsCard } from './readings/ReadingsCard.tsx';
import { BatchSide } from './side/BatchSide.tsx';

/** One batch opened: what was planned and read, how it ferments, how its cake was judged. */
export function BatchPage() {
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
  const { id = '' } = useParams();
  const { index } = useBoardView();
  const { path } = useBrewery();
  const batch = index.batch(id.toLowerCase());
  useTitle(batch?.name ?? 'No such batch');
  if (batch) return <OpenedBatch key={batch.id} batch={batch} />;
  return (
    <Page>
      <h1 className="text-h1">This batch is not on the board</h1>
      <p className="mt-2 text-ink2">
        Somebody deleted it, or it is of another season.{' '}
        <TextLink to={path()}>Go to the board</TextLink>
      </p>
    </Page>
  );
}

function OpenedBatch({ batch }: { batch: Batch }) {
  const { slug, board } = useBoardView();
  const { data: record, error, refetch } = useBatchRecord(slug, batch.id, board.season.revision);
  return (
    <div className="flex min-w-0 grow max-wide:flex-col print:block">
      <main id="main" className="flex min-w-0 flex-1 outline-none max-wide:flex-col print:block">
        <BatchSide batch={batch} />
        <div className="min-w-0 flex-1 space-y-4 px-[26px] pt-[18px] pb-10 max-tablet:px-[18px]">
          {record ? (
            <>
              <FermentationCard batch={batch} record={record} />
              <PlannedAndRead batch={batch} />
              <KeptOffline value>
                <ReadingsCard batch={batch} record={record} />
                <EventsCard batch={batch} events={record.events} />
                <NotesCard batch={batch} notes={record.notes} />
              </KeptOffline>
              <HistoryCard batchId={batch.id} />
            </>
          ) : error ? (
            <Notice kind="hold" alert>
              <p>{sentenceOf(error)}</p>
              <Button size="small" className="mt-2" onClick={() => void refetch()}>
                Try again
              </Button>
            </Notice>
          ) : (
            <Skeleton rows={4} label={`Opening the record of ${batch.name}`} />
          )}
        </div>
      </main>
      {record && (
        <KeptOffline value>
          <CakeCheckPanel batch={batch} record={record} />
        </KeptOffline>
      )}
      <BoardForms />
    </div>
  );
}
