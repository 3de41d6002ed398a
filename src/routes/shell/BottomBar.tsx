import clsx from 'clsx';
import { Beaker, CalendarCheck, Ellipsis, Microscope } from 'lucide-react';
import type { ReactNode } from 'react';
import { NavLink, useLocation } from 'react-router-dom';
import { useBrewery } from '../../app/useBrewery.ts';
import { Menu, MenuLink } from '../../components/ui/Menu.tsx';
import { ShelfIcon } from './ShelfIcon.tsx';

const CELL =
  'flex min-h-14 min-w-0 flex-1 flex-col items-center justify-center gap-0.5 text-small font-semibold';

/** The pages at the thumb of a phone. */
export function BottomBar() {
  const brewery = useBrewery();
  return (
    <nav
      aria-label="Pages"
      data-cover
      className="fixed inset-x-0 bottom-0 z-30 flex border-t border-line bg-paper px-2 pt-1 pb-[max(.5rem,env(safe-area-inset-bottom))] tablet:hidden print:hidden"
    >
      <Tab to={brewery.path('today')} icon={<CalendarCheck size={22} aria-hidden />} name="Today" />
      <Tab to={brewery.path()} end icon={<ShelfIcon />} name="Board" />
      <Tab to={brewery.path('yeasts')} icon={<Microscope size={22} aria-hidden />} name="Yeasts" />
      <Tab to={brewery.path('vessels')} icon={<Beaker size={22} aria-hidden />} name="Vessels" />
      <More />
    </nav>
  );
}

interface TabProps {
  to: string;
  end?: boolean;
  icon: ReactNode;
  name: string;
}

function Tab({ to, end = false, icon, name }: TabProps) {
  return (
    <NavLink
      to={to}
      end={end}
      className={({ isActive }) => clsx(CELL, isActive ? 'text-bottle' : 'text-ink2')}
    >
      {({ isActive }) => <TabFace active={isActive} icon={icon} name={name} />}
    </NavLink>
  );
}

function TabFace({ active, icon, name }: { active: boolean; icon: ReactNode; name: string }) {
  return (
    <>
      <span className={clsx('rounded-full px-4 py-1', active && 'bg-bottle-l')}>{icon}</span>
      {name}
    </>
  );
}

function More() {
  const brewery = useBrewery();
  const { pathname } = useLocation();
  const active = /\/(people|season|rules|record|account)$/.test(pathname);
  return (
    <Menu
      button={{
        className: clsx(CELL, active ? 'text-bottle' : 'text-ink2'),
        children: <TabFace active={active} icon={<Ellipsis size={22} aria-hidden />} name="More" />,
      }}
    >
      <MenuLink to={brewery.path('people')}>People</MenuLink>
      <MenuLink to={brewery.path('season')}>Season</MenuLink>
      <MenuLink to={brewery.path('rules')}>House rules</MenuLink>
      <MenuLink to={brewery.path('record')}>Record</MenuLink>
      <MenuLink to={brewery.path('account')}>Account and units</MenuLink>
      <MenuLink to="/breweries">Breweries</MenuLink>
    </Menu>
  );
}
