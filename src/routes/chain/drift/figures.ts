import type { DriftPoint } from '#shared/chain/drift.ts';

/** One figure that is followed along a line. */
export interface Figure {
  title: string;
  unit: string;
  valueOf: (point: DriftPoint) => number | null;
  textOf: (point: DriftPoint) => string | null;
  /** The smallest difference that fills its plot. */
  least: number;
}

const percent = (share: number | null): number | null => (share === null ? null : share * 100);
const whole = (value: number | null, unit: string): string | null =>
  value === null ? null : `${Math.round(value)}${unit}`;

/** "10 to 16 h": it began somewhere between two readings. */
function lagText({ lagHours: { least, most } }: DriftPoint): string | null {
  if (most === null) return least === null || least === 0 ? null : `over ${Math.round(least)} h`;
  if (least === null || least === 0) return `under ${Math.round(most)} h`;
  return `${Math.round(least)} to ${Math.round(most)} h`;
}

export const FIGURES: readonly Figure[] = [
  {
    title: 'Attenuation',
    unit: 'apparent, %',
    valueOf: ({ attenuation }) => percent(attenuation),
    textOf: ({ attenuation }) => whole(percent(attenuation), ' %'),
    least: 10,
  },
  {
    title: 'Lag',
    unit: 'hours to the first fall, at most',
    valueOf: ({ lagHours }) => lagHours.most,
    textOf: lagText,
    least: 12,
  },
  {
    title: 'Alive',
    unit: 'of the cake, counted, %',
    valueOf: ({ viability }) => percent(viability),
    textOf: ({ viability }) => whole(percent(viability), ' %'),
    least: 10,
  },
  {
    title: 'Days',
    unit: 'from brew day to racking',
    valueOf: ({ days }) => days,
    textOf: ({ days }) => whole(days, ''),
    least: 7,
  },
];
