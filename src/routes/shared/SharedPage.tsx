import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { useParams } from 'react-router-dom';
import type { SharedChain } from '#shared/api/share.ts';
import { isProblem, sentenceOf } from '../../api/errors.ts';
import { useSession } from '../../api/session.ts';
import { sharedQuery } from '../../api/share.ts';
import { useTitle } from '../../app/useTitle.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { BoardViewOf } from '../board/view/BoardView.tsx';
import { PublicForm } from '../public/PublicForm.tsx';
import { sharedView } from './sharedBoard.ts';
import { SharedCarries } from './SharedCarries.tsx';
import { SharedChainList } from './SharedChainList.tsx';
import { SharedFoot } from './SharedFoot.tsx';
import { SharedBar, SharedHead } from './SharedHead.tsx';
import { useNoIndex } from './useNoIndex.ts';

/** One chain for whoever has its link: to look at, and to copy. */
export function SharedPage() {
  const { token = '' } = useParams();
  useNoIndex();
  const { data, error } = useQuery(sharedQuery(token));
  useTitle(data ? data.chain.name : 'A shared chain');
  if (error) return <NoLongerGood error={error} />;
  if (!data)
    return (
      <PublicForm title="A shared chain" lead="Looking at the link.">
        <Skeleton rows={3} />
      </PublicForm>
    );
  return <Shared shared={data} token={token} />;
}

function Shared({ shared, token }: { shared: SharedChain; token: string }) {
  const units = useSession().data?.units ?? shared.units;
  const view = useMemo(() => sharedView(shared, units), [shared, units]);
  return (
    <BoardViewOf value={view}>
      <div className="flex min-h-dvh flex-col">
        <SharedBar />
        <main
          id="main"
          className="mx-auto grid w-full max-w-[1080px] grow content-start gap-x-14 px-[22px] pt-6 pb-10 outline-none wide:grid-cols-[minmax(0,1fr)_340px]"
        >
          <div className="min-w-0">
            <SharedHead shared={shared} />
            <SharedChainList />
          </div>
          <SharedCarries shared={shared} />
        </main>
        <SharedFoot shared={shared} token={token} />
      </div>
    </BoardViewOf>
  );
}

function NoLongerGood({ error }: { error: unknown }) {
  const gone = isProblem(error, 'link-used') || isProblem(error, 'not-found');
  return (
    <PublicForm
      title={gone ? 'This link is no longer good' : 'The link could not be read'}
      lead={
        gone
          ? 'It has run out or was withdrawn. Ask whoever gave it to you for a new one.'
          : sentenceOf(error)
      }
    >
      <LinkButton to="/">To the front page</LinkButton>
    </PublicForm>
  );
}
