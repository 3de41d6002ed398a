import { useEffect } from 'react';
import { useSession } from '../../api/session.ts';
import { leaving } from '../../app/leaving.ts';
import { useTitle } from '../../app/useTitle.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { firstPageOf, firstPageWords } from '../public/home.ts';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { ExampleColumn } from './ExampleColumn.tsx';
import { ExampleHead } from './ExampleHead.tsx';
import { ExampleShelf } from './ExampleShelf.tsx';
import { WelcomeFoot } from './WelcomeFoot.tsx';

export function WelcomePage() {
  useTitle('Barmkin');
  useEffect(() => leaving.end(), []);
  return (
    <div className="flex min-h-dvh flex-col">
      <PublicHeader />
      <main id="main" className="grow outline-none">
        <Hero />
        <section aria-labelledby="example" className="pt-11 pb-10 max-tablet:pt-7">
          <ExampleHead />
          <div className="max-wide:hidden">
            <ExampleShelf />
          </div>
          <div className="wide:hidden">
            <ExampleColumn />
          </div>
        </section>
      </main>
      <WelcomeFoot />
    </div>
  );
}

function Hero() {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-10 gap-y-4 px-14 pt-8 max-wide:px-10 max-tablet:px-5 max-tablet:pt-4">
      <h1 className="max-w-[820px] text-hero text-wrap font-[740] tracking-hero outline-none max-tablet:text-[2.6875rem]">
        Plan which beer goes onto which yeast cake.
      </h1>
      <div className="max-w-[400px]">
        <p className="text-lead text-ink2">
          For small brewing teams who reuse their yeast. Barmkin checks every pour before you make
          it, and keeps the order and the dates.
        </p>
        <Actions />
      </div>
    </div>
  );
}

function Actions() {
  const { data: me } = useSession();
  return (
    <div className="mt-4 flex flex-wrap gap-3 max-tablet:*:flex-1">
      {me ? (
        <LinkButton look="first" size="large" to={firstPageOf(me)}>
          {firstPageWords(me)}
        </LinkButton>
      ) : (
        <>
          <LinkButton look="first" size="large" to="/sign-up">
            Start a brewery
          </LinkButton>
          <LinkButton size="large" to="/sign-in">
            Sign in
          </LinkButton>
        </>
      )}
    </div>
  );
}
