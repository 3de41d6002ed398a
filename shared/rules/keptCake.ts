import { retainedBeerL } from '../cake/blend.ts';
import type { Interval } from './answer.ts';
import type { BatchFacts, PourFacts, VesselFacts } from './facts.ts';
import { freeCakeL } from './freeCake.ts';
import type { LinkCake } from './linkCake.ts';
import type { HouseRules } from './resolve.ts';
import { withoutNoise } from './rounding.ts';

/** What decides how a kept part works: the two beers, the cake, the need and the vessel. */
interface Around {
  a: BatchFacts;
  b: BatchFacts;
  pour: PourFacts;
  rules: HouseRules;
  vessel: VesselFacts | undefined;
  cake: LinkCake | undefined;
  need: number | undefined;
}

/** What of the cake goes under B, and what comes with it. `undefined` is unknown. */
export interface KeptCake {
  keptL: number | undefined;
  /** Kept part of the whole, 0–1. */
  share: number | undefined;
  /** More was asked for than there is. */
  clamped: boolean;
  /** Beer of A that stays with it, litres. */
  retainedL: number | undefined;
  /** Living cells kept ÷ need. */
  ratio: number | undefined;
  /** Upper bound of the ratio, where the wait or the part is unknown. */
  ratioAtMost: number | undefined;
  /** Free space ÷ B's volume. */
  freeShare: number | undefined;
  /** Upper bound of the free share, where the cake is unknown. */
  freeShareAtMost: number | undefined;
}

/**
 * @param keepL part to keep, litres; undefined: all that no other wort gets; `unknown`: some part of
 *   that, which cannot be told yet.
 */
export function keptCake(link: Around, keepL: number | 'unknown' | undefined): KeptCake {
  const whole = link.cake?.volumeL.likely;
  const free = freeCakeL(whole, link.pour);
  const clamped = typeof keepL === 'number' && free !== undefined && keepL > free;
  const keptL = partOf(clamped ? undefined : keepL, free);
  const share = shareOf(keptL, whole);
  const leftL = leftAbove(link);
  const { freeShare, freeShareAtMost } = freeSpace(link, keptL, share, leftL);
  return {
    keptL,
    share,
    clamped,
    retainedL:
      share === 0
        ? 0
        : keptL === undefined || whole === undefined || leftL === undefined
          ? undefined
          : retainedBeerL({ keptL, cakeL: whole, leftAboveL: leftL }),
    ratio: share === 0 ? 0 : ratioOf(link.cake?.viableCells, share, link.need),
    ratioAtMost: ratioOf(link.cake?.freshCells, share ?? shareOf(free, whole), link.need),
    freeShare,
    freeShareAtMost,
  };
}

/** Of a cake of which nothing is free, any part is nothing. */
function partOf(
  keepL: number | 'unknown' | undefined,
  free: number | undefined,
): number | undefined {
  if (keepL === 'unknown') return free === 0 ? 0 : undefined;
  return keepL ?? free;
}

function shareOf(keptL: number | undefined, whole: number | undefined): number | undefined {
  if (keptL === 0) return 0;
  return whole === undefined || keptL === undefined ? undefined : keptL / whole;
}

/** Beer left above the whole cake, litres. */
function leftAbove(link: Around): number | undefined {
  const { a, pour, rules } = link;
  if (pour.leftAboveL !== undefined) return pour.leftAboveL;
  return a.volumeL === undefined ? undefined : a.volumeL * rules.leftAboveShare;
}

function ratioOf(
  cells: Interval | undefined,
  share: number | undefined,
  need: number | undefined,
): number | undefined {
  if (cells === undefined || share === undefined || need === undefined) return undefined;
  return need === 0 ? Infinity : withoutNoise((cells.likely * share) / need);
}

function freeSpace(
  link: Around,
  keptL: number | undefined,
  share: number | undefined,
  leftL: number | undefined,
): Pick<KeptCake, 'freeShare' | 'freeShareAtMost'> {
  const capacityL = link.vessel?.capacityL;
  const volumeL = link.b.volumeL;
  if (capacityL === undefined || volumeL === undefined)
    return { freeShare: undefined, freeShareAtMost: undefined };
  const atMost = withoutNoise((capacityL - volumeL) / volumeL);
  if (share === 0) return { freeShare: atMost, freeShareAtMost: atMost };
  if (keptL === undefined || share === undefined || leftL === undefined)
    return { freeShare: undefined, freeShareAtMost: atMost };
  const free = withoutNoise((capacityL - volumeL - keptL - leftL * share) / volumeL);
  return { freeShare: free, freeShareAtMost: free };
}
