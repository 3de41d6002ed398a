import { useParams } from 'react-router-dom';
import type { Role } from '#shared/api/people.ts';
import { placeOf } from '#shared/api/urls.ts';
import { useSession } from '../api/session.ts';

export interface BreweryHere {
  /** The place in the address, for what is asked of the server: the slug, maybe with a season. */
  slug: string;
  /** The brewery's own part of it. */
  brewerySlug: string;
  name: string;
  role: Role;
  /** Address of a page in this brewery, and in the season that is shown: `path('yeasts')`. */
  path: (page?: string) => string;
}

/** The brewery in the address. Only under `/b/:brewery`, behind the shell's guard. */
export function useBrewery(): BreweryHere {
  const { brewery: brewerySlug = '' } = useParams();
  const slug = usePlace() ?? brewerySlug;
  const membership = useSession().data?.breweries.find((m) => m.brewery.slug === brewerySlug);
  return {
    slug,
    brewerySlug,
    name: membership?.brewery.name ?? '',
    role: membership?.role ?? 'taster',
    path: (page) => `/b/${slug}${page ? `/${page}` : ''}`,
  };
}

/** The brewery in the address, with its season where that names one; null on pages of no brewery. */
export function usePlace(): string | null {
  const { brewery, season } = useParams();
  return brewery === undefined ? null : placeOf(brewery, season);
}
