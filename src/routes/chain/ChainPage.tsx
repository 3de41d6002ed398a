import { Suspense, useMemo } from 'react';
import { useParams } from 'react-router-dom';
import type { Chain } from '#shared/api/chain.ts';
import { courseOf } from '#shared/chain/course.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BoardForms } from '../board/BoardForms.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardSkeleton } from '../board/states/BoardSkeleton.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { usePhone } from '../board/view/useMedia.ts';
import { Page } from '../shell/Page.tsx';
import { ChainHead } from './ChainHead.tsx';
import { ChainPlots } from './ChainPlots.tsx';
import { CourseTable } from './CourseTable.tsx';
import { Drift } from './drift/Drift.tsx';
import { ChainSide } from './side/ChainSide.tsx';

/** One chain opened: what climbs along it, who is on it, what is said of it. */
export function ChainPage() {
  return (
    <BoardFault>
      <Suspense fallback={<BoardSkeleton />}>
        <BoardViewProvider>
          <FoundChain />
        </BoardViewProvider>
      </Suspense>
    </BoardFault>
  );
}

function FoundChain() {
  const { id = '' } = useParams();
  const { index } = useBoardView();
  const { path } = useBrewery();
  const chain = index.chain(id.toLowerCase());
  useTitle(chain?.name ?? 'No such shelf');
  if (chain) return <OpenedChain chain={chain} />;
  return (
    <Page>
      <h1 className="text-h1">This shelf is not on the board</h1>
      <p className="mt-2 text-ink2">
        Somebody took it down, or it is of another season.{' '}
        <TextLink to={path()}>Go to the board</TextLink>
      </p>
    </Page>
  );
}

function OpenedChain({ chain }: { chain: Chain }) {
  const { board, judged } = useBoardView();
  const phone = usePhone();
  const course = useMemo(() => courseOf(board, chain.id, judged), [board, judged, chain.id]);
  return (
    <div className="flex min-w-0 grow max-wide:flex-col print:block">
      <main
        id="main"
        className="min-w-0 flex-1 pt-4 pb-10 pl-7 outline-none max-tablet:pl-[18px] print:p-0"
      >
        <ChainHead chain={chain} />
        {course.points.length === 0 ? (
          <p className="mt-6 mr-7 rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
            No batch stands on this shelf yet. Put one on it from the board.
          </p>
        ) : phone ? (
          <>
            <CourseTable course={course} />
            <ChainPlots chain={chain} course={course} />
          </>
        ) : (
          <>
            <ChainPlots chain={chain} course={course} />
            <CourseTable course={course} />
          </>
        )}
        <Drift chainId={chain.id} />
      </main>
      <ChainSide chain={chain} />
      <BoardForms />
    </div>
  );
}
