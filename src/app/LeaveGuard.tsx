import { useEffect } from 'react';
import { useBlocker, type BlockerFunction } from 'react-router-dom';
import { LeaveDialog } from '../components/ui/LeaveDialog.tsx';
import { isUnsaved } from './unsaved.ts';

const leadsAway: BlockerFunction = ({ currentLocation, nextLocation }) =>
  isUnsaved() &&
  (currentLocation.pathname !== nextLocation.pathname ||
    currentLocation.search !== nextLocation.search);

/** Links, the browser's back and a closed tab ask before they take away something typed. */
export function LeaveGuard() {
  const blocker = useBlocker(leadsAway);
  useEffect(() => {
    const onUnload = (event: BeforeUnloadEvent) => {
      if (isUnsaved()) event.preventDefault();
    };
    window.addEventListener('beforeunload', onUnload);
    return () => window.removeEventListener('beforeunload', onUnload);
  }, []);
  if (blocker.state !== 'blocked') return null;
  return <LeaveDialog onStay={() => blocker.reset()} onLeave={() => blocker.proceed()} />;
}
