import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import { boardQuery } from '../../api/board.ts';
import { sessionQuery, useSession } from '../../api/session.ts';
import { rememberBrewery } from '../../app/lastBrewery.ts';
import { useBrewery } from '../../app/useBrewery.ts';

/**
 * Draws nothing: remembers which brewery was used last on this device, and asks anew who is signed
 * in when the board says that somebody has another role by now.
 */
export function KeepSession() {
  const { slug, role } = useBrewery();
  const client = useQueryClient();
  const me = useSession().data?.id;
  const { data: roleNow } = useQuery({ ...boardQuery(slug), select: (board) => board.me.role });
  useEffect(() => {
    if (me !== undefined) rememberBrewery(me, slug);
  }, [me, slug]);
  useEffect(() => {
    if (roleNow !== undefined && roleNow !== role) void client.invalidateQueries(sessionQuery);
  }, [client, role, roleNow]);
  return null;
}
