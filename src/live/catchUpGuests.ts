import type { QueryClient } from '@tanstack/react-query';
import { placeOf } from '#shared/api/urls.ts';
import { boardQuery } from '../api/board.ts';
import { createCatchUp, type CatchUp } from './catchUp.ts';

/**
 * Reads the boards of other breweries anew, of which a chain stands on this one. What is told does
 * not say which of them changed, and there are few.
 */
export function catchUpGuests(
  client: QueryClient,
  slug: string,
): Pick<CatchUp, 'elsewhere' | 'again'> {
  const catchUps = new Map<string, CatchUp>();
  const all = () => {
    const guests = client.getQueryData(boardQuery(slug).queryKey)?.guests ?? [];
    return guests.map(({ ownerSlug, seasonId }) => {
      const place = placeOf(ownerSlug, seasonId);
      const known = catchUps.get(place) ?? createCatchUp(client, place, seasonId);
      catchUps.set(place, known);
      return known;
    });
  };
  return {
    elsewhere: () => new Set(all()).forEach((each) => each.elsewhere()),
    again: () => new Set(all()).forEach((each) => each.again()),
  };
}
