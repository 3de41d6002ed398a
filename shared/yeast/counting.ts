/**
 * Counts under the microscope, in an improved Neubauer chamber: 25 squares of 0.2 mm, 0.1 mm deep,
 * which is 1e-4 mL over the whole 1 mm² (ASBC MOA Yeast-4).
 */
const SQUARES = 25;
const ML_OVER_ALL = 1e-4;

/** Two-sided 95 % of the normal distribution. */
const Z95 = 1.959964;

/** Cells per mL from a count in n of the 25 squares of a sample diluted `dilution`-fold. */
export const cellsPerMl = (count: number, squares: number, dilution: number): number =>
  (count * (SQUARES / squares) * dilution) / ML_OVER_ALL;

/** Cells per mL from counts in fields of `fieldMm2` each, their mean taken. */
export const cellsPerMlOfFields = (
  counts: readonly number[],
  fieldMm2: number,
  dilution: number,
): number => (mean(counts) / fieldMm2 / ML_OVER_ALL) * dilution;

const mean = (values: readonly number[]): number =>
  values.reduce((sum, value) => sum + value, 0) / values.length;

/** Scatter of counts between fields as a share of their mean (n − 1); needs two or more. */
export function scatter(counts: readonly number[]): number {
  const centre = mean(counts);
  const squares = counts.reduce((sum, count) => sum + (count - centre) ** 2, 0);
  return Math.sqrt(squares / (counts.length - 1)) / centre;
}

/** Standard error of a count by chance alone, as a share of it (Poisson); real scatter is larger. */
export const countError = (count: number): number => 1 / Math.sqrt(count);

/** Living share, 0–1, of living and dead cells counted. */
export const viability = (living: number, dead: number): number => living / (living + dead);

/** 95 % interval of the living share by chance alone (Wilson 1927, J. Am. Stat. Assoc. 22:209). */
export function viabilityInterval(living: number, dead: number): { low: number; high: number } {
  const n = living + dead;
  const p = living / n;
  const z2n = Z95 ** 2 / n;
  const centre = p + z2n / 2;
  const half = Z95 * Math.sqrt((p * (1 - p)) / n + z2n / (4 * n));
  return { low: (centre - half) / (1 + z2n), high: (centre + half) / (1 + z2n) };
}

/** Dead cells of pitching yeast, shares: target, and from where a plant excludes it (MEBAK M-350.18.518). */
export const MEBAK_DEAD = { target: 0.02, exclude: 0.05 } as const;
