import { Link } from 'react-router-dom';
import type { ReactNode } from 'react';
import { useSession } from '../../api/session.ts';
import { Wordmark } from '../../components/ui/Wordmark.tsx';
import { TextLink } from '../../components/ui/TextLink.tsx';
import { homeOf, homeWords } from './home.ts';

/** Top of the pages that anyone may read. */
export function PublicHeader({ children }: { children?: ReactNode }) {
  const { data: me } = useSession();
  return (
    <header className="flex h-19 items-center px-14 max-tablet:px-5 max-tablet:h-16">
      <Link to="/" aria-label="Barmkin, front page" className="rounded-lg">
        <Wordmark onPaper />
      </Link>
      <nav aria-label="Account" className="ml-auto flex items-center gap-6 text-touch">
        {children ?? (
          <TextLink to={me ? homeOf(me) : '/sign-in'} className="py-2.5">
            {me ? homeWords(me) : 'Sign in'}
          </TextLink>
        )}
      </nav>
    </header>
  );
}
