import { useMemo, useState } from 'react';
import type { Chain } from '#shared/api/chain.ts';
import { courseOf } from '#shared/chain/course.ts';
import { formatDay } from '#shared/units/day.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useBoardView } from '../../board/view/BoardView.tsx';
import { PaperPage } from '../PaperPage.tsx';
import { NothingToPrint, PrintFrame, useIdInAddress } from '../PrintFrame.tsx';
import { PaperShelf } from '../PaperShelf.tsx';
import { ChainLine } from '../season/PrintedShelf.tsx';
import { PrintedFigures } from './PrintedFigures.tsx';
import { PrintedFindings } from './PrintedFindings.tsx';
import { PrintedPlots } from './PrintedPlots.tsx';
import { PrintedTalk } from './PrintedTalk.tsx';

/** One chain on paper: its shelf, what climbs along it, the figures, what each link says. */
export function ChainPrint() {
  return (
    <PrintFrame>
      <FoundChain />
    </PrintFrame>
  );
}

function FoundChain() {
  const id = useIdInAddress();
  const chain = useBoardView().index.chain(id);
  return chain ? (
    <PrintedChain chain={chain} />
  ) : (
    <NothingToPrint title="This shelf is not on the board" />
  );
}

function PrintedChain({ chain }: { chain: Chain }) {
  const { board, judged } = useBoardView();
  const { path } = useBrewery();
  const [withTalk, setWithTalk] = useState(false);
  const course = useMemo(() => courseOf(board, chain.id, judged), [board, judged, chain.id]);
  return (
    <PaperPage
      title={chain.name}
      back={{ to: path(`chains/${chain.id}`), name: 'The chain' }}
      options={
        <label className="flex min-h-9 items-center gap-2 max-tablet:min-h-11">
          <input
            type="checkbox"
            className="size-5 accent-bottle"
            checked={withTalk}
            onChange={(event) => setWithTalk(event.target.checked)}
          />
          With the talk
        </label>
      }
    >
      <header>
        <h1 className="text-[1.9em] leading-[1.1]">{chain.name}</h1>
        <p className="mt-0.5">
          {board.brewery.name}, {board.season.name}, as it stood on {formatDay(board.today)}
        </p>
        <ChainLine chain={chain} />
      </header>
      <h2 className="sr-only">Batches</h2>
      <PaperShelf chain={chain} />
      {course.points.length > 0 && (
        <>
          <PrintedPlots course={course} />
          <PrintedFigures course={course} />
          <PrintedFindings course={course} />
        </>
      )}
      {withTalk && <PrintedTalk chainId={chain.id} />}
    </PaperPage>
  );
}
