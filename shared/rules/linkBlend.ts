import { blend } from '../cake/blend.ts';
import type { BatchFacts } from './facts.ts';

/** B with A's retained beer in it; undefined where unknown. */
export interface LinkBlend {
  og: number | undefined;
  srm: number | undefined;
  ibu: number | undefined;
}

export function linkBlend(a: BatchFacts, b: BatchFacts, retainedL: number | undefined): LinkBlend {
  const mix = (xB: number | undefined, xA: number | undefined): number | undefined => {
    if (xB === undefined || retainedL === 0) return xB;
    if (retainedL === undefined || b.volumeL === undefined || xA === undefined) return undefined;
    return blend(b.volumeL, xB, retainedL, xA);
  };
  // What stays of A is beer, so its gravity is the final one.
  return { og: mix(b.og, a.fg), srm: mix(b.srm, a.srm), ibu: mix(b.ibu, a.ibu) };
}
