import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useEffect } from 'react';
import type { Role } from '#shared/api/people.ts';
import { boardQuery } from '../../api/board.ts';
import { sessionQuery, useSession } from '../../api/session.ts';
import { rememberBrewery } from '../../app/lastBrewery.ts';
import { useBrewery } from '../../app/useBrewery.ts';

/**
 * Draws nothing: remembers which brewery was used last on this device, and asks anew who is signed
 * in when the board says that somebody has another role, or other guest shelves, by now.
 */
export function KeepSession() {
  const { slug, brewerySlug, role } = useBrewery();
  const client = useQueryClient();
  const { data: me } = useSession();
  const { data: onBoard } = useQuery({
    ...boardQuery(slug),
    select: ({ me: here, guests }) => gist(here.role, guests),
  });
  const known = gist(role, me?.guestOf.filter(({ onBoardOf }) => onBoardOf === brewerySlug) ?? []);
  useEffect(() => {
    if (me) rememberBrewery(me.id, brewerySlug);
  }, [me, brewerySlug]);
  useEffect(() => {
    if (onBoard !== undefined && onBoard !== known) void client.invalidateQueries(sessionQuery);
  }, [client, known, onBoard]);
  return null;
}

const gist = (role: Role, guests: readonly { guestId: string }[]) =>
  [role, ...guests.map(({ guestId }) => guestId).toSorted()].join();
