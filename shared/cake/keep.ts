import type { Wort } from '../yeast/pitching.ts';
import { points } from '../units/gravity.ts';
import type { CakeEstimate } from './estimate.ts';

/** How much of a cake to keep. */
export interface KeptPart {
  litres: number;
  kg: number;
  /** Of the whole cake, 0–1. */
  share: number;
  /** False where even the whole cake falls short at the low end of its estimate. */
  meetsNeed: boolean;
}

/**
 * The part whose low-end estimate meets the need (viable cells), at most all of the cake. Beside it
 * the page shows the trade's rule of thumb, which knows nothing of how well the yeast waited.
 */
export function recommendedKeep({
  cake,
  need,
}: {
  cake: Omit<CakeEstimate, 'settledCells'>;
  need: number;
}): KeptPart {
  const meetsNeed = cake.viableCells.low >= need;
  const share = meetsNeed && need > 0 ? need / cake.viableCells.low : meetsNeed ? 0 : 1;
  return {
    litres: share * cake.volumeL.likely,
    kg: share * cake.massKg.likely,
    share,
    meetsNeed,
  };
}

/** Up to 17 °P. */
const USUAL_UP_TO_POINTS = 70;

/**
 * The trade's rule of thumb, kg of slurry for a wort: for ales 10–17 g per litre up to 17 °P
 * (1.070), 20–27 g above; double for lagers. Common practice.
 */
export function thumbKg({ volumeL, og, kind }: Wort): { low: number; high: number } {
  const [low, high] = points(og) <= USUAL_UP_TO_POINTS ? [10, 17] : [20, 27];
  const kgPerGram = (kind === 'lager' ? 2 : 1) / 1000;
  return { low: low * volumeL * kgPerGram, high: high * volumeL * kgPerGram };
}
