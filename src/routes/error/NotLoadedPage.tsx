import { useEffect } from 'react';
import { api } from '#shared/api/urls.ts';
import { useTitle } from '../../app/useTitle.ts';
import { Button } from '../../components/ui/Button.tsx';
import { PublicHeader } from '../public/PublicHeader.tsx';

const LOOK_EVERY_MS = 3_000;
/** A fault that a reload does not mend is not met with one reload after the other. */
const REST_MS = 30_000;
const KEY = 'barmkin-loaded-again-at';

const hasRested = () => Date.now() - Number(sessionStorage.getItem(KEY) ?? 0) > REST_MS;

function loadAgain() {
  sessionStorage.setItem(KEY, String(Date.now()));
  location.reload();
}

/** In place of a page that did not arrive, as when the network was lost while it was loaded. */
export function NotLoadedPage() {
  useTitle('Not loaded yet');
  useEffect(() => {
    const look = async () => {
      if (!hasRested()) return;
      const answer = await fetch(api.health, { cache: 'no-store' }).catch(() => null);
      if (answer?.ok) loadAgain();
    };
    const timer = window.setInterval(() => void look(), LOOK_EVERY_MS);
    return () => window.clearInterval(timer);
  }, []);
  return (
    <>
      <PublicHeader>
        <span />
      </PublicHeader>
      <main id="main" className="mx-auto w-full max-w-2xl px-7 py-16 outline-none max-tablet:px-5">
        <h1 className="font-display text-h0 font-bold tracking-[-.03em] max-tablet:text-h1">
          This page has not arrived.
        </h1>
        <p className="mt-4 text-lead text-ink2" role="status">
          The connection was lost while it was loaded. It is loaded again as soon as the server
          answers. What was saved is safe.
        </p>
        <div className="mt-6">
          <Button look="first" size="large" onClick={loadAgain}>
            Load the page again
          </Button>
        </div>
      </main>
    </>
  );
}
