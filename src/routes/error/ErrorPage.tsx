import { useEffect } from 'react';
import { isRouteErrorResponse, useRouteError } from 'react-router-dom';
import { reportClientError } from '../../api/clientErrors.ts';
import { ProblemError, sentenceOf } from '../../api/errors.ts';
import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { homeOf, homeWords } from '../public/home.ts';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { ShelfFoot } from '../public/ShelfFoot.tsx';
import { NotFoundPage } from './NotFoundPage.tsx';

export function ErrorPage() {
  const error = useRouteError();
  useEffect(() => reportClientError(error, location.pathname), [error]);
  if (isRouteErrorResponse(error) && error.status === 404) return <NotFoundPage />;
  return <Failed error={error} />;
}

function Failed({ error }: { error: unknown }) {
  useTitle('Something went wrong');
  const { data: me } = useSession();
  const requestId = error instanceof ProblemError ? error.problem.instance : undefined;
  return (
    <div className="flex min-h-dvh flex-col">
      <PublicHeader>
        <span />
      </PublicHeader>
      <main id="main" className="mx-auto w-full max-w-2xl px-7 py-16 outline-none max-tablet:px-5">
        <h1 className="font-display text-h0 font-bold tracking-[-.03em]">This page failed.</h1>
        <p className="mt-4 text-lead text-ink2">{sentenceOf(error)}</p>
        <p className="mt-2 text-ink2">What was saved is safe.</p>
        {requestId && (
          <p className="mt-2 text-ink2">
            Request <code className="font-semibold text-ink">{requestId}</code>; whoever runs this
            server finds it in the log by that name.
          </p>
        )}
        <div className="mt-6 flex flex-wrap gap-3">
          <Button look="first" size="large" onClick={() => location.reload()}>
            Load the page again
          </Button>
          <LinkButton look="quiet" size="large" to={homeOf(me)} reloadDocument>
            {homeWords(me)}
          </LinkButton>
        </div>
      </main>
      <ShelfFoot />
    </div>
  );
}
