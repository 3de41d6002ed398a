import { Suspense, useMemo } from 'react';
import { useParams } from 'react-router-dom';
import { familyOf } from '#shared/chain/family.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { PageHead } from '../../components/ui/PageHead.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BoardViewProvider, useBoardView } from '../board/view/BoardView.tsx';
import { Page } from '../shell/Page.tsx';
import { FamilyList } from './FamilyList.tsx';
import { FamilyTree } from './FamilyTree.tsx';

/** What came of a yeast in this season: packs, batches, branches. */
export function FamilyPage() {
  return (
    <Page>
      <Suspense fallback={<Skeleton label="Loading the family" />}>
        <BoardViewProvider>
          <Family />
        </BoardViewProvider>
      </Suspense>
    </Page>
  );
}

function Family() {
  const { id = '' } = useParams();
  const { board, index, judged } = useBoardView();
  const { path } = useBrewery();
  const yeast = index.yeasts.get(id.toLowerCase());
  useTitle(yeast ? `Family of ${yeast.name}` : 'No such yeast');
  const family = useMemo(() => familyOf(board, id.toLowerCase(), judged), [board, id, judged]);
  const back = (
    <p className="mb-1 text-small text-ink2 print:hidden">
      <TextLink to={path('yeasts')}>Yeasts</TextLink> / {board.season.name}
    </p>
  );
  if (!yeast)
    return (
      <>
        {back}
        <PageHead
          title="There is no such yeast"
          lead="Somebody deleted it, or the address is wrong."
        />
      </>
    );
  return (
    <>
      {back}
      <PageHead
        title={`Family of ${yeast.name}`}
        lead="From each pack to the batches on it, and the branches from their cakes."
      />
      {family.length === 0 ? (
        <p className="rounded-xl border-[1.5px] border-dashed border-edge px-4 py-3 text-ink2">
          No shelf lives on this yeast yet.
        </p>
      ) : (
        <>
          <FamilyTree family={family} />
          <h2 className="mt-8 text-shelf">The same as a list</h2>
          <FamilyList family={family} />
        </>
      )}
    </>
  );
}
