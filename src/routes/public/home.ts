import type { Person } from '#shared/api/people.ts';
import { isPhone } from '../../app/isPhone.ts';
import { lastBrewery } from '../../app/lastBrewery.ts';

/**
 * Where somebody belongs: the brewery that they used last on this device, or their only one; where
 * they have several, or none, the page to choose or make one.
 */
export function homeOf(person: Person | null | undefined): string {
  if (!person) return '/';
  const slugs = person.breweries.map(({ brewery }) => brewery.slug);
  const last = lastBrewery(person.id);
  const slug = last !== null && slugs.includes(last) ? last : slugs.length === 1 ? slugs[0] : null;
  return slug ? `/b/${slug}` : '/breweries';
}

/** Where one begins in it: on a phone with what is to be done today, else with the board. */
export function firstPageOf(person: Person | null | undefined): string {
  const home = homeOf(person);
  return home.startsWith('/b/') && isPhone() ? `${home}/today` : home;
}

/** The words on the way there. */
export function homeWords(person: Person | null | undefined): string {
  if (!person) return 'To the front page';
  return homeOf(person) === '/breweries' ? 'Your breweries' : 'To the board';
}

export const firstPageWords = (person: Person) =>
  firstPageOf(person).endsWith('/today') ? 'To today’s work' : homeWords(person);

/** Only an address within this site is gone to after signing in. */
export function safeNext(next: string | null): string | null {
  return next && /^\/(?![/\\])/.test(next) ? next : null;
}
