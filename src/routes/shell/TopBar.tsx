import clsx from 'clsx';
import { Link, NavLink } from 'react-router-dom';
import { useBrewery } from '../../app/useBrewery.ts';
import { OutboxMark } from '../../app/besideThePage.tsx';
import { Wordmark } from '../../components/ui/Wordmark.tsx';
import { AccountMenu } from './AccountMenu.tsx';
import { BreweryMenu } from './BreweryMenu.tsx';
import { LiveMark } from './LiveMark.tsx';
import { Members } from './Members.tsx';
import { PAGES } from './pages.ts';

export function TopBar() {
  const brewery = useBrewery();
  return (
    <header className="on-bar print:hidden flex h-15 shrink-0 items-center gap-7 bg-bar px-7 text-on-bar max-wide:gap-3 max-tablet:h-13 max-tablet:px-[18px]">
      <Link to={brewery.path()} aria-label="Barmkin, to the board" className="rounded-lg">
        <Wordmark />
      </Link>
      <nav aria-label="Pages" className="flex gap-1 max-tablet:hidden print:hidden">
        {PAGES.map((page) => (
          <NavLink
            key={page.name}
            to={brewery.path(page.path)}
            end={page.path === ''}
            className={({ isActive }) =>
              clsx(
                'rounded-lg px-3.5 py-2 max-wide:px-2.5',
                isActive
                  ? 'bg-on-bar/15 font-semibold text-on-bar'
                  : 'font-medium text-on-bar2 hover:bg-on-bar/8',
              )
            }
          >
            {page.name}
          </NavLink>
        ))}
      </nav>
      <div className="ml-auto flex min-w-0 items-center gap-3.5 text-small text-on-bar2">
        <BreweryMenu />
        <OutboxMark />
        <LiveMark />
        <Members />
        <AccountMenu />
      </div>
    </header>
  );
}
