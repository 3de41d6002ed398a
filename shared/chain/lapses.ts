import type { BoardFacts } from './board.ts';

/** Placeholder until links are read. */
export function lapses(_before: BoardFacts, _after: BoardFacts): string[] {
  return [];
}
