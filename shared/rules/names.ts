import type { LinkState } from './linkState.ts';

/** What the two beers are called within a sentence, and at its start. */
export interface Names {
  a: string;
  b: string;
  A: string;
  B: string;
}

export function namesOf({ a, b }: Pick<LinkState, 'a' | 'b'>): Names {
  return {
    a: a.name ?? 'the earlier beer',
    b: b.name ?? 'the new beer',
    A: a.name ?? 'The earlier beer',
    B: b.name ?? 'The new beer',
  };
}
