import { useSession } from '../../api/session.ts';
import { useTitle } from '../../app/useTitle.ts';
import { LinkButton } from '../../components/ui/LinkButton.tsx';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { homeOf, homeWords } from '../public/home.ts';

export function NotFoundPage() {
  useTitle('Nothing here');
  const { data: me } = useSession();
  return (
    <>
      <PublicHeader />
      <main id="main" className="mx-auto max-w-2xl px-7 py-16 max-tablet:px-5 max-tablet:py-10">
        <h1 className="font-display text-h0 font-bold tracking-[-.03em] outline-none max-tablet:text-h1">
          Nothing stands here.
        </h1>
        <p className="mt-4 text-lead text-ink2">
          The address may be mistyped, or the page belongs to a brewery that you are not in.
        </p>
        <div className="mt-6">
          <LinkButton look="first" size="large" to={homeOf(me)}>
            {homeWords(me)}
          </LinkButton>
        </div>
      </main>
    </>
  );
}
