/** Where a value stands in a lane, px from its top: a larger value stands higher. */
export type Scale = (value: number) => number;

interface Lane {
  /** Of the largest and the smallest value, px. */
  top: number;
  bottom: number;
  /** The smallest difference that fills the lane: less is drawn as the little that it is. */
  least: number;
}

/** A straight scale over the known values; without any, all stands in the middle. */
export function scaleOf(values: readonly (number | null)[], { top, bottom, least }: Lane): Scale {
  const known = values.filter((value) => value !== null && Number.isFinite(value));
  if (known.length === 0) return () => (top + bottom) / 2;
  const low = Math.min(...(known as number[]));
  const high = Math.max(...(known as number[]));
  const span = Math.max(high - low, least);
  const floor = (low + high) / 2 - span / 2;
  return (value) => bottom - ((value - floor) / span) * (bottom - top);
}

/** For multiples, of which twice and half are equally far from one. `least`: in doublings. */
export function ratioScaleOf(values: readonly (number | null)[], lane: Lane): Scale {
  const scale = scaleOf(
    values.map((value) => (value === null || value <= 0 ? null : Math.log2(value))),
    lane,
  );
  return (value) => (value <= 0 ? lane.bottom : scale(Math.log2(value)));
}

/** A label stands on the side of its point where the line to the next one does not go. */
export function labelSide(values: readonly (number | null)[], place: number): 'above' | 'below' {
  const [here, next] = [values[place] ?? null, values[place + 1] ?? null];
  return here !== null && next !== null && next > here ? 'below' : 'above';
}

export interface Stroke {
  fromPlace: number;
  toPlace: number;
}

/** Lines between neighbours that are both known; nothing is drawn through what is not. */
export function strokesOf(values: readonly (number | null)[]): Stroke[] {
  return values.flatMap((value, place) => {
    const next = values[place + 1];
    if (value === null || next === null || next === undefined) return [];
    return [{ fromPlace: place, toPlace: place + 1 }];
  });
}
