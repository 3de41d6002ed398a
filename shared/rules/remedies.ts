import type { KeptCake } from './keptCake.ts';
import type { LinkState } from './linkState.ts';

/** The figures of keeping the recommended part, where that is less than what is kept now. */
export function recommendedInstead(link: LinkState): (KeptCake & { keptL: number }) | undefined {
  const litres = link.recommended?.litres;
  const now = link.kept.keptL;
  if (litres === undefined || now === undefined || litres >= now) return undefined;
  return { ...link.keeping(litres), keptL: litres };
}

const severity = { passed: 0, mind: 1, hold: 2 } as const;
export type Graded = keyof typeof severity;

export const milder = (than: Graded, is: Graded): boolean => severity[is] < severity[than];

/** Rounds up to a tenth, so that what is written is never short of what is needed. */
export const upToTenth = (value: number): number => Math.ceil(value * 10 - 1e-9) / 10;
export const downToTenth = (value: number): number => Math.floor(value * 10 + 1e-9) / 10;
