import { beerLab, GLASS_CM, type Lab } from '../units/colour.ts';
import { deltaE00 } from '../units/deltaE.ts';
import { withoutNoise } from './rounding.ts';

/** Planned colours are few, and each is compared with many. Dropped when there are too many. */
const planned = new Map<number, Lab>();
const MOST_COLOURS = 2000;

function plannedLab(srm: number): Lab {
  const known = planned.get(srm);
  if (known) return known;
  if (planned.size >= MOST_COLOURS) planned.clear();
  const lab = beerLab(srm, GLASS_CM);
  planned.set(srm, lab);
  return lab;
}

/** ΔE00 between a beer as planned and at another colour, SRM, in the glass; undefined: unknown. */
export function colourShift(
  plannedSrm: number | undefined,
  srm: number | undefined,
): number | undefined {
  if (plannedSrm === undefined || srm === undefined) return undefined;
  if (srm === plannedSrm) return 0;
  return withoutNoise(deltaE00(plannedLab(plannedSrm), beerLab(srm, GLASS_CM)));
}
