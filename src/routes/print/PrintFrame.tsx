import { Suspense, type ReactNode } from 'react';
import { useParams } from 'react-router-dom';
import { useBrewery } from '../../app/useBrewery.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { BoardFault } from '../board/states/BoardFault.tsx';
import { BoardViewProvider } from '../board/view/BoardView.tsx';
import { Page } from '../shell/Page.tsx';

/** The board's figures for a page on paper. */
export function PrintFrame({ children }: { children: ReactNode }) {
  return (
    <BoardFault>
      <Suspense
        fallback={
          <Page>
            <Skeleton label="Loading the board" />
          </Page>
        }
      >
        <BoardViewProvider>{children}</BoardViewProvider>
      </Suspense>
    </BoardFault>
  );
}

/** The id in the address, as the board writes ids. */
export const useIdInAddress = (): string => (useParams().id ?? '').toLowerCase();

/** What was to be printed is not there. */
export function NothingToPrint({ title }: { title: string }) {
  const { path } = useBrewery();
  useTitle(title);
  return (
    <Page>
      <h1 className="text-h1">{title}</h1>
      <p className="mt-2 text-ink2">
        It was moved or taken down, or it is of another season.{' '}
        <TextLink to={path()}>Go to the board</TextLink>
      </p>
    </Page>
  );
}
