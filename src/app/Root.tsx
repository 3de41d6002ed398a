import { Outlet } from 'react-router-dom';
import { FocusOnNavigation } from './FocusOnNavigation.tsx';
import { MENUS } from './menus.ts';
import { SkipLink } from './SkipLink.tsx';

export function Root() {
  return (
    <>
      <SkipLink />
      <FocusOnNavigation />
      <Outlet />
      <section id={MENUS} aria-label="Open menu" />
    </>
  );
}
