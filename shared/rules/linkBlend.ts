import { blend } from '../cake/blend.ts';
import type { BatchFacts } from './facts.ts';

/** B with A's retained beer in it; undefined where unknown. */
export interface LinkBlend {
  og: number | undefined;
  srm: number | undefined;
  ibu: number | undefined;
}

export function linkBlend(a: BatchFacts, b: BatchFacts, retainedL: number | undefined): LinkBlend {
  // What stays of A is beer, so its gravity is the final one.
  return {
    og: mixed(b.volumeL, b.og, retainedL, a.fg),
    srm: mixed(b.volumeL, b.srm, retainedL, a.srm),
    ibu: mixed(b.volumeL, b.ibu, retainedL, a.ibu),
  };
}

function mixed(
  volumeL: number | undefined,
  xB: number | undefined,
  retainedL: number | undefined,
  xA: number | undefined,
): number | undefined {
  if (xB === undefined || retainedL === 0) return xB;
  if (retainedL === undefined || volumeL === undefined || xA === undefined) return undefined;
  return blend(volumeL, xB, retainedL, xA);
}
