import { MessageSquare } from 'lucide-react';
import { Link } from 'react-router-dom';
import type { Chain } from '#shared/api/chain.ts';
import { useIsGuestHere } from '../../../api/board.ts';
import { useBrewery } from '../../../app/useBrewery.ts';
import { useBoardView } from '../view/BoardView.tsx';
import { count } from '../view/words.ts';

/** The shelf's name; opens the chain. Of another brewery's there is the shelf alone. */
export function ChainName({ chain }: { chain: Chain }) {
  const { path } = useBrewery();
  const isGuest = useIsGuestHere();
  if (isGuest) return chain.name;
  return (
    <Link
      to={path(`chains/${chain.id}`)}
      className="decoration-2 underline-offset-4 hover:underline"
    >
      {chain.name}
    </Link>
  );
}

/** That somebody said something since one last looked. */
export function UnreadMark({ chain }: { chain: Chain }) {
  const { board } = useBoardView();
  const { path } = useBrewery();
  const unread = board.unread[chain.id] ?? 0;
  if (unread === 0) return null;
  return (
    <Link
      to={path(`chains/${chain.id}`)}
      aria-label={`${count(unread, 'new comment')} on ${chain.name}`}
      className="mt-1 inline-flex min-h-6 items-center gap-1 rounded-verdict bg-bottle px-2 text-label font-bold text-on-bottle max-tablet:min-h-11 max-tablet:px-3"
    >
      <MessageSquare size={14} aria-hidden />
      {unread} new
    </Link>
  );
}
