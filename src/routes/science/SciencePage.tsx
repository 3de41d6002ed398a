import { Suspense, useMemo } from 'react';
import { sightOf } from '#shared/chain/boardLink.ts';
import { linkInput } from '#shared/chain/linkInput.ts';
import { useTitle } from '../../app/useTitle.ts';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { Page } from '../shell/Page.tsx';
import { Science, type Choice } from './Science.tsx';
import { SCIENCE_LEAD } from './lead.ts';

/** The science with the figures of one's own links. */
export function SciencePage() {
  useTitle('The science');
  return (
    <BoardFault>
      <Page>
        <Suspense fallback={<Skeleton label="Loading the board" />}>
          <BoardViewProvider>
            <OwnScience />
          </BoardViewProvider>
        </Suspense>
      </Page>
    </BoardFault>
  );
}

function OwnScience() {
  const { board, index, units } = useBoardView();
  const choices = useMemo(() => {
    const sight = sightOf(board, units);
    return index.chains
      .flatMap((chain) => index.batchesOf(chain.id))
      .flatMap((later): Choice[] => {
        const earlier = index.predecessor(later.id);
        const input = earlier ? linkInput(later.id, sight) : null;
        if (!earlier || !input) return [];
        return [{ id: later.id, earlier: earlier.name, later: later.name, input }];
      });
  }, [board, index, units]);
  return (
    <div className="mx-auto max-w-[1080px]">
      <PageHead title="The science" lead={SCIENCE_LEAD} />
      <Science
        choices={choices}
        units={units}
        without="No batch is poured onto another’s cake yet: once two stand on a shelf, their figures stand here."
      />
    </div>
  );
}
