import type { VesselShape } from '#shared/api/vessel.ts';

/** Outlines in a box of 84 × 132 whose foot, at 129, stands on the shelf. */
export const OUTLINES: Record<VesselShape, string> = {
  bucket: 'M10 26 H74 L69 124 Q68.6 129 63 129 H21 Q15.4 129 15 124 Z',
  carboy:
    'M35 8 H49 V24 C49 33 74 36 74 54 V118 Q74 129 63 129 H21 Q10 129 10 118 V54 C10 36 35 33 35 24 Z',
  conical: 'M12 22 H72 V84 L49 125 Q47 129 42 129 Q37 129 35 125 L12 84 Z',
  keg: 'M20 18 Q12 18 12 28 V117 Q12 129 22 129 H62 Q72 129 72 117 V28 Q72 18 64 18 Z',
};

/** What sits on top (a block) and beside (lines): lid, stopper, airlock, legs, handle. */
export const FITTINGS: Record<
  VesselShape,
  { block: [number, number, number, number, number]; lines: string }
> = {
  bucket: { block: [7, 20, 70, 8, 3], lines: 'M50 20v-8q0-3 3-3t3 3v3q0 3 3 3t3-3v-6' },
  carboy: { block: [34, 3, 16, 7, 2], lines: 'M42 3v-8q0-3 3-3t3 3v3q0 3 3 3t3-3v-5' },
  conical: {
    block: [8, 16, 68, 8, 3],
    lines: 'M17 88v40M67 88v40M50 16v-7q0-3 3-3t3 3v3q0 3 3 3t3-3v-6',
  },
  keg: { block: [16, 11, 52, 9, 4], lines: 'M30 11v-4h24v4' },
};

const FOOT = 129;
const BRIM = 22;
const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value));

/** Height of the beer's surface for a fill of 0 to 1 of the capacity. */
export const beerTop = (fill: number): number => FOOT - (FOOT - BRIM) * clamp(fill, 0.04, 0.98);

/**
 * Height of the cake's surface for its share of the capacity, 0 to 1. It is drawn thicker than to
 * scale, so that the strata can be seen: a litre in a 32 L bucket would be a line.
 */
export const cakeTop = (shape: VesselShape, share: number): number => {
  const drawn = clamp(0.07 + 1.5 * share, 0.07, 0.24);
  return shape === 'conical' ? FOOT - 46 * Math.sqrt(drawn * 3.2) : FOOT - (FOOT - BRIM) * drawn;
};

/** Outline width in the box's own units, for an outline of about 2.2 px at any size. */
export const outlineWidth = (width: number): number => clamp((2.15 * 84) / width, 1.2, 3);
