import { randomUUID } from 'node:crypto';
import type { GuestMade, GuestRole } from '#shared/api/guest.ts';
import { api } from '#shared/api/urls.ts';
import { good, type TestSeason } from './season.ts';
import { newcomer, type Visitor } from './visitor.ts';

export interface TestGuest {
  visitor: Visitor;
  /** Their own brewery. */
  slug: string;
  guestId: string;
}

/** An invitation to a chain, as its head brewer makes it. */
export const invited = (
  { head, slug }: Pick<TestSeason, 'head' | 'slug'>,
  chainId: string,
  role: GuestRole = 'brewer',
) => good<GuestMade>(head.post(api.guests(slug, chainId), { id: randomUUID(), role }));

/** Somebody of another brewery, with the chain on their own board. */
export async function guestOn(
  season: Pick<TestSeason, 'head' | 'slug'>,
  chainId: string,
  role: GuestRole = 'brewer',
): Promise<TestGuest> {
  const { token, id } = await invited(season, chainId, role);
  const { visitor, slug } = await newcomer(season.head.base, 'Estuary Ales');
  await good(visitor.post(api.guestInvitation(token), { brewerySlug: slug }));
  return { visitor, slug, guestId: id };
}
