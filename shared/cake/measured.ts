import type { Cake } from '../api/batch.ts';
import type { CakeCheckWrite } from '../api/cakeCheck.ts';
import { cellsPerMl, viability } from '../yeast/counting.ts';

type Measured = NonNullable<Cake['measured']>;

/** Mass of the cake, kg: weighed itself, or the vessel with it less the empty one; null: neither. */
export const massOf = ({
  massKg,
  fullKg,
  tareKg,
}: Pick<CakeCheckWrite, 'massKg' | 'fullKg' | 'tareKg'>): number | null =>
  fullKg !== null && tareKg !== null ? fullKg - tareKg : massKg;

/**
 * What of a cake was measured when it was judged: litres, kg, living share, cells per mL (living and
 * dead, as the chamber shows them). Null where nothing was.
 */
export function measuredOf(check: CakeCheckWrite): Measured | null {
  const { volumeL, count } = check;
  const massKg = massOf(check);
  if (volumeL === null && massKg === null && count === null) return null;
  return {
    volumeL,
    massKg,
    viability: count && viability(count.living, count.dead),
    cellsPerMl: count && cellsPerMl(count.living + count.dead, count.squares, count.dilution),
  };
}
