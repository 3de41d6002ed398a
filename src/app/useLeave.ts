import { useNavigate } from 'react-router-dom';
import { sentenceOf } from '../api/errors.ts';
import { useSignOut } from '../api/session.ts';
import { say } from '../components/ui/Toast.tsx';
import { leaving } from './leaving.ts';

/** Signs out and goes to the front page, whether the answer or the live stream tells it first. */
export function useLeave(): () => void {
  const navigate = useNavigate();
  const signOut = useSignOut();
  return () => {
    leaving.begin();
    signOut.mutate(undefined, {
      onSuccess: () => navigate('/'),
      onError: (error) => {
        leaving.end();
        say(sentenceOf(error));
      },
    });
  };
}
