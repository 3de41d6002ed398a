import { Navigate } from 'react-router-dom';
import { useSession } from '../../api/session.ts';
import { wayToSignIn } from '../../app/leaving.ts';
import { Toaster } from '../../components/ui/Toast.tsx';
import { homeOf } from '../public/home.ts';
import { PublicHeader } from '../public/PublicHeader.tsx';
import { AccountPage } from './AccountPage.tsx';

/** `/account` leads to the account page under one's own brewery; who has none finds it here. */
export function ToAccount() {
  const { data: me, isPending } = useSession();
  if (isPending) return null;
  if (!me) return <Navigate to={wayToSignIn('/account')} replace />;
  const home = homeOf(me);
  const [first] = me.breweries;
  if (first) {
    const at = home.startsWith('/b/') ? home : `/b/${first.brewery.slug}`;
    return <Navigate to={`${at}/account`} replace />;
  }
  return (
    <>
      <PublicHeader />
      <AccountPage />
      <Toaster />
    </>
  );
}
