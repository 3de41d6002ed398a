import { Navigate } from 'react-router-dom';
import { sentenceOf } from '../../api/errors.ts';
import { useSession } from '../../api/session.ts';
import { Notice } from '../../components/ui/Notice.tsx';
import { firstPageOf } from '../public/home.ts';

/** Where the installed app begins: in one's brewery, or at the sign-in. */
export function ToStart() {
  const { data: me, isPending, error } = useSession();
  if (isPending) return null;
  if (error && !me)
    return (
      <main id="main" className="mx-auto max-w-xl p-8">
        <h1 className="mb-3 text-h1">Barmkin</h1>
        <Notice kind="hold">{sentenceOf(error)}</Notice>
      </main>
    );
  return <Navigate to={me ? firstPageOf(me) : '/sign-in'} replace />;
}
