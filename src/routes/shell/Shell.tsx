import { Suspense } from 'react';
import { Navigate, Outlet, useLocation, useParams } from 'react-router-dom';
import { sentenceOf } from '../../api/errors.ts';
import { useSession } from '../../api/session.ts';
import { LeaveGuard } from '../../app/LeaveGuard.tsx';
import { wayToSignIn } from '../../app/leaving.ts';
import { Keys } from '../../keys/Keys.tsx';
import { Notice } from '../../components/ui/Notice.tsx';
import { OfflineBanner } from '../../components/ui/OfflineBanner.tsx';
import { Skeleton } from '../../components/ui/Skeleton.tsx';
import { Toaster } from '../../components/ui/Toast.tsx';
import { NewRelease, StoppedStrip } from '../../app/besideThePage.tsx';
import { BottomBar } from './BottomBar.tsx';
import { KeepSession } from './KeepSession.tsx';
import { LiveSeason } from './LiveSeason.tsx';
import { NotFoundHere, ShownHere } from './NotFoundHere.tsx';
import { Page } from './Page.tsx';
import { TopBar } from './TopBar.tsx';

/** Everything behind the sign-in: the bar, the page, the bar of a phone. */
export function Shell() {
  const session = useSession();
  const location = useLocation();
  const { brewery } = useParams();
  if (session.isPending) return null;
  if (session.error && !session.data)
    return (
      <main id="main" className="mx-auto max-w-xl p-8">
        <Notice kind="hold">{sentenceOf(session.error)}</Notice>
      </main>
    );
  if (!session.data) {
    return <Navigate to={wayToSignIn(location.pathname + location.search)} replace />;
  }
  // Somebody else's brewery looks like one that does not exist.
  if (!session.data.breweries.some((m) => m.brewery.slug === brewery))
    return <NotFoundHere slug={brewery ?? ''} />;
  return (
    <div className="flex min-h-dvh flex-col print:block print:min-h-0">
      <TopBar />
      <OfflineBanner />
      <NewRelease />
      <StoppedStrip />
      <LiveSeason />
      <KeepSession />
      <ShownHere slug={brewery ?? ''} />
      <div className="flex min-w-0 grow flex-col max-tablet:pb-20 print:block print:pb-0">
        <Suspense fallback={<Loading />}>
          <Outlet />
        </Suspense>
      </div>
      <BottomBar />
      <Keys />
      <LeaveGuard />
      <Toaster />
    </div>
  );
}

const Loading = () => (
  <Page>
    <Skeleton label="Loading the brewery" />
  </Page>
);
