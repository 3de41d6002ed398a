import type { Person } from '#shared/api/people.ts';

/** Where somebody belongs: the board of the first brewery, or the front page. */
export function homeOf(person: Person | null | undefined): string {
  const first = person?.breweries[0];
  return first ? `/b/${first.brewery.slug}` : '/';
}

/** Only an address within this site is gone to after signing in. */
export function safeNext(next: string | null): string | null {
  return next && /^\/(?![/\\])/.test(next) ? next : null;
}
