import type { LinkAnswer } from '#shared/rules/answer.ts';

/** Less than this is what sticks to the vessel, litres. */
const NOTHING = 0.01;

/** What is left of a cake once the kept part stays, litres; 0 where all of it stays, or nothing is known. */
export function restOf({ cake, keep }: Pick<LinkAnswer, 'cake' | 'keep'>): number {
  if (cake.volumeL === null || keep.keptL === null) return 0;
  const left = cake.volumeL - keep.keptL;
  return left > NOTHING ? left : 0;
}
