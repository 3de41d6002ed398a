import { useEffect, useState } from 'react';
import { useTitle } from '../../app/useTitle.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { NotFoundPage } from '../error/NotFoundPage.tsx';
import { PublicHeader } from '../public/PublicHeader.tsx';

/** Breweries that were shown in this page since it was loaded. */
const shown = new Set<string>();

/** Draws nothing: keeps in mind that the brewery was there. */
export function ShownHere({ slug }: { slug: string }) {
  useEffect(() => void shown.add(slug), [slug]);
  return null;
}

/**
 * Somebody else's brewery looks like one that does not exist; of one that was just on the page it is
 * said what happened.
 */
export function NotFoundHere({ slug }: { slug: string }) {
  const [wasHere] = useState(() => shown.has(slug));
  return wasHere ? <NoLongerHere /> : <NotFoundPage />;
}

function NoLongerHere() {
  useTitle('No longer in this brewery');
  return (
    <>
      <PublicHeader>
        <span />
      </PublicHeader>
      <main id="main" className="mx-auto max-w-2xl px-7 py-16 max-tablet:px-5 max-tablet:py-10">
        <h1 className="font-display text-h0 font-bold tracking-[-.03em] outline-none max-tablet:text-h1">
          You no longer belong to this brewery.
        </h1>
        <p className="mt-4 text-lead text-ink2">
          You left, or a head brewer removed you. What you did there stays in its record. To come
          back, ask for a join link.
        </p>
        <div className="mt-6">
          <LinkButton look="first" size="large" to="/breweries">
            Your breweries
          </LinkButton>
        </div>
      </main>
    </>
  );
}
