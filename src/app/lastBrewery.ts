/** The brewery that somebody used last on this device. Without storage there is none. */

const keyOf = (personId: string) => `barmkin-brewery ${personId}`;

export function rememberBrewery(personId: string, slug: string): void {
  try {
    localStorage.setItem(keyOf(personId), slug);
  } catch {
    // A browser that keeps nothing asks again.
  }
}

export function lastBrewery(personId: string): string | null {
  try {
    return localStorage.getItem(keyOf(personId));
  } catch {
    return null;
  }
}
