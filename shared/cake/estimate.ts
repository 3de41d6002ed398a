import type { Interval } from '../rules/answer.ts';
import type { MeasuredCake } from '../rules/facts.ts';
import type { TrubLevel, YeastKind } from '../rules/vocabulary.ts';
import { growthPerMl } from '../yeast/growth.ts';
import { pitchNeed } from '../yeast/pitching.ts';

export interface CakeFacts {
  /** Litres of the beer that made the cake, its original and final SG, its kind of yeast. */
  volumeL: number;
  og: number;
  fg: number;
  kind: YeastKind;
  /** Default `some`. */
  trub?: TrubLevel | undefined;
  /** Share of living cells that outlast the wait, 0–1; 1 for a cake that does not wait. */
  survival: number;
  measured?: MeasuredCake | undefined;
}

/** Cells, litres and kilograms, each with its 90 % interval. */
export interface CakeEstimate {
  settledCells: Interval;
  viableCells: Interval;
  volumeL: Interval;
  massKg: Interval;
  /** True where anything of it was weighed, measured or counted. */
  measured: boolean;
}

/** Share of all cells that settles and is not racked away (0.80–0.99). */
export const SETTLED = 0.9;
/** Living share at racking (0.85–0.98). */
export const VIABILITY = 0.92;
/** Cells in a mL of clean settled yeast; published figures run from 1.2e9 to 3e9. */
export const CELLS_PER_ML_CAKE = 1.2e9;
export const TRUB_SHARE: Readonly<Record<TrubLevel, number>> = {
  little: 0.1,
  some: 0.2,
  much: 0.4,
};
export const CAKE_KG_PER_L = 1.05;

/** Growth may be this much smaller or larger: ln-SD 0.35 between strains and runs, 90 %. */
export const GROWTH_SPREAD = 1.8;
/**
 * The same after the living share was counted. Its own spread, ln-SD 0.04 of 0.85–0.98, is taken
 * out in quadrature; that is little, because growth is what is uncertain.
 */
const COUNTED_GROWTH_SPREAD = 1.77;
/** Cells from a measured volume or mass: what a mL of cake holds, 0.8–1.8e9 for a usual cake. */
const DENSITY_SPREAD = 1.5;
/** Cells from a measured volume and a counted density: sampling, dilution and counting. */
const COUNT_SPREAD = 1.2;
/** A volume or mass that was read or weighed, ± 5 %. */
const READING_SPREAD = 1.05;

const around = (likely: number, spread: number): Interval => ({
  low: likely / spread,
  likely,
  high: likely * spread,
});
const times = ({ low, likely, high }: Interval, by: number): Interval => ({
  low: low * by,
  likely: likely * by,
  high: high * by,
});

/** Settled cells by growth: pitched at A's own need, growth ÷ and × its spread, the rest central. */
function grownCells(cake: CakeFacts): Interval {
  const pitched = pitchNeed(cake);
  const grown = growthPerMl(cake.og, cake.fg) * cake.volumeL * 1000;
  const spread = cake.measured?.viability === undefined ? GROWTH_SPREAD : COUNTED_GROWTH_SPREAD;
  return times(
    { low: pitched + grown / spread, likely: pitched + grown, high: pitched + grown * spread },
    SETTLED,
  );
}

/** The spread around a measured figure; measuring never widens what growth alone would say. */
function narrowed(likely: number, spread: number, grown: Interval): Interval {
  if (grown.likely <= 0) return around(likely, spread);
  return {
    low: likely * Math.max(1 / spread, grown.low / grown.likely),
    likely,
    high: likely * Math.min(spread, grown.high / grown.likely),
  };
}

const filled = (cells: number, cellsPerLitre: number, batchL: number): number =>
  Math.min(cells / cellsPerLitre || 0, batchL);

/** Litres that so many cells fill; a cake is never larger than the batch it came from. */
function litresOf(cells: Interval, cellsPerLitre: number, batchL: number): Interval {
  return {
    low: filled(cells.low, cellsPerLitre, batchL),
    likely: filled(cells.likely, cellsPerLitre, batchL),
    high: filled(cells.high, cellsPerLitre, batchL),
  };
}

/** Cells of the cake: from its measured litres, or grown, as far as a counted density allows. */
function settledIn(
  measuredL: number | undefined,
  perLitre: number,
  estimatedL: Interval,
  grown: Interval,
  cake: CakeFacts,
): Interval {
  const counted = cake.measured?.cellsPerMl !== undefined;
  if (measuredL === undefined) return counted ? times(estimatedL, perLitre) : grown;
  return narrowed(measuredL * perLitre, counted ? COUNT_SPREAD : DENSITY_SPREAD, grown);
}

/**
 * The cake that a beer leaves. A measured volume or mass gives the cells in place of growth; a count
 * per mL of slurry, trub included, replaces the usual density; a counted living share replaces the
 * usual one at racking, and the wait still takes its part. Each narrows the interval.
 *
 * Growth: `yeast/growth`; settled and living shares: ranges of the handbooks, judged; density and
 * trub: common practice.
 */
export function estimateCake(cake: CakeFacts): CakeEstimate {
  const { volumeL, massKg, viability, cellsPerMl } = cake.measured ?? {};
  const perLitre = 1000 * (cellsPerMl ?? CELLS_PER_ML_CAKE * (1 - TRUB_SHARE[cake.trub ?? 'some']));
  const measuredL = volumeL ?? (massKg === undefined ? undefined : massKg / CAKE_KG_PER_L);
  const grown = grownCells(cake);
  const estimatedL = litresOf(grown, perLitre, cake.volumeL);
  const settledCells = settledIn(measuredL, perLitre, estimatedL, grown, cake);
  const volume = measuredL === undefined ? estimatedL : around(measuredL, READING_SPREAD);
  return {
    settledCells,
    viableCells: times(settledCells, (viability ?? VIABILITY) * cake.survival),
    volumeL: volume,
    massKg: massKg === undefined ? times(volume, CAKE_KG_PER_L) : around(massKg, READING_SPREAD),
    measured: (volumeL ?? massKg ?? viability ?? cellsPerMl) !== undefined,
  };
}
