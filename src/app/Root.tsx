import { Outlet } from 'react-router-dom';
import { FocusOnNavigation } from './FocusOnNavigation.tsx';
import { SkipLink } from './SkipLink.tsx';

export function Root() {
  return (
    <>
      <SkipLink />
      <FocusOnNavigation />
      <Outlet />
    </>
  );
}
