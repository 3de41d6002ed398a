import type { Batch } from '../api/batch.ts';
import type { Day } from '../rules/vocabulary.ts';
import { dayNumber, dayOf } from '../units/day.ts';
import { isPencilled, order, type BoardFacts } from './board.ts';
import { nextBrewDay } from './dates.ts';
import type { Gap } from './gap.ts';
import { placesFor, type Place } from './gapPlaces.ts';
import { JudgedGap, type WeighedPlace } from './judgedGap.ts';
import { NONE } from './trial/numbers.ts';
import { newShelfOf } from './trial/roster.ts';
import type { TrialPlace } from './trial/trial.ts';
import { Scales } from './weigh.ts';

export type { Gap } from './gap.ts';

/**
 * Every place that a lifted batch could have: each gap of each shelf in their order, a new shelf,
 * the bench. A gap is judged over the links that come about by the drop (before the batch, behind
 * it, and where it was) and those that the drop makes worse (generation, inheritance, dates,
 * vessels). Nothing for a batch that is not pencilled.
 */
export function judgeGaps(board: BoardFacts, batchId: string): Gap[] {
  const scales = new Scales(board);
  const { index } = scales.sight;
  const batch = index.batch(batchId);
  if (!batch || !isPencilled(batch)) return [];
  const gaps = placesFor(index, batch)
    .map(weigherOf(scales, batch))
    .map((weighed) => new JudgedGap(weighed));
  const best = bestOf(gaps);
  if (best) best.best = true;
  return gaps;
}

/** Weighs the places of one pencilled batch. */
export function weigherOf(scales: Scales, batch: Batch): (place: Place) => WeighedPlace {
  let own: number | undefined;
  const ownDay = () => (own ??= numberOr(nextBrewDay(scales.sight.index, batch.id)));
  return (place) => weighPlace(scales, batch, place, ownDay);
}

const numberOr = (day: Day | null): number => (day === null ? NONE : dayNumber(day));

function weighPlace(
  scales: Scales,
  batch: Batch,
  place: Place,
  ownDay: () => number,
): WeighedPlace {
  if (place.locked) return { place, changed: [], brewOn: null, generation: null };
  if (place.here) return asItStands(scales, batch, place);
  const number = scales.roster.numberOf(batch.id);
  const { changed, brewDay, generation } = scales.weigh(number, trialPlace(scales, place, ownDay));
  return {
    place,
    changed,
    brewOn: brewDay === NONE ? null : dayOf(brewDay),
    generation: generationAt(place.chainId, generation),
  };
}

function trialPlace({ roster }: Scales, place: Place, ownDay: () => number): TrialPlace {
  const { chainId, afterId, added } = place;
  const shelf =
    chainId === null ? NONE : added ? newShelfOf(roster) : roster.shelfNumberOf(chainId);
  const after = afterId === null ? NONE : roster.numberOf(afterId);
  return { shelf, after, added, ownDay };
}

/** The bench is no place in a descent. */
const generationAt = (chainId: string | null, generation: number): number | null =>
  chainId === null || generation === NONE ? null : generation;

/** The place where the batch is: the links before and behind it as they are. */
function asItStands(scales: Scales, batch: Batch, place: Place): WeighedPlace {
  const { index } = scales.sight;
  const mates = batch.chainId === null ? [] : index.batchesOf(batch.chainId);
  const next = mates[mates.indexOf(batch) + 1];
  const changed = [batch.id, ...(next ? [next.id] : [])].map((laterId) => {
    const now = scales.standing(laterId);
    return { laterId, before: now, after: now, relinked: true };
  });
  const generation = generationAt(batch.chainId, scales.generationOf(batch.id));
  return { place, changed, brewOn: batch.brewOn, generation };
}

/**
 * Best first: fewest holds, then fewest minds, smallest colour shift, earliest date, order on the
 * board. A new shelf costs a pack, so it stands behind every gap that holds no more than it; the
 * bench puts a beer nowhere and comes last. Locked places are left out.
 */
export function rankGaps(gaps: readonly Gap[]): Gap[] {
  return gaps.filter((gap) => gap.locked === null).toSorted(compareGaps);
}

/** The best gap; null where every shelf is closed to the batch. */
function bestOf(gaps: readonly Gap[]): Gap | null {
  let best: Gap | null = null;
  for (const gap of gaps)
    if (gap.locked === null && (best === null || compareGaps(gap, best) < 0)) best = gap;
  return best?.key === 'bench' ? null : best;
}

export const compareGaps = (a: Gap, b: Gap): number =>
  Number(a.key === 'bench') - Number(b.key === 'bench') ||
  a.holds - b.holds ||
  Number(a.key === 'new') - Number(b.key === 'new') ||
  a.minds - b.minds ||
  shiftOf(a) - shiftOf(b) ||
  order(a.brewOn ?? LATEST, b.brewOn ?? LATEST);

/** What is not known does not win. */
const LATEST = '9999-12-31';
const shiftOf = (gap: Gap): number => gap.colourShift ?? Number.MAX_VALUE;
