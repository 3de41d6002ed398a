import type { PourFacts } from './facts.ts';

/** What of a cake is left when the parts of other worts are taken off, litres. */
export function freeCakeL(
  wholeL: number | undefined,
  { sharedWith }: Pick<PourFacts, 'sharedWith'>,
): number | undefined {
  if (wholeL === undefined) return undefined;
  const taken = sharedWith?.reduce((sum, { litres }) => sum + litres, 0) ?? 0;
  return Math.max(0, wholeL - taken);
}
