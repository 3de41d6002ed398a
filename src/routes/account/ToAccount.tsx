import { Navigate } from 'react-router-dom';
import { useSession } from '../../api/session.ts';
import { homeOf } from '../public/home.ts';

/** `/account` leads to the account page under one's own brewery. */
export function ToAccount() {
  const { data: me, isPending } = useSession();
  if (isPending) return null;
  return (
    <Navigate to={me?.breweries[0] ? `${homeOf(me)}/account` : '/sign-in?next=/account'} replace />
  );
}
