import { useParams } from 'react-router-dom';
import type { Role } from '#shared/api/people.ts';
import { useSession } from '../api/session.ts';

export interface BreweryHere {
  slug: string;
  name: string;
  role: Role;
  /** Address of a page in this brewery: `path('yeasts')`. */
  path: (page?: string) => string;
}

/** The brewery in the address. Only under `/b/:brewery`, behind the shell's guard. */
export function useBrewery(): BreweryHere {
  const { brewery: slug = '' } = useParams();
  const membership = useSession().data?.breweries.find((m) => m.brewery.slug === slug);
  return {
    slug,
    name: membership?.brewery.name ?? '',
    role: membership?.role ?? 'taster',
    path: (page) => `/b/${slug}${page ? `/${page}` : ''}`,
  };
}
