import type { ReactNode } from 'react';
import type { UnitPrefs } from '#shared/api/units.ts';
import type { Workings } from '#shared/science/workings.ts';
import { DEFAULT_UNITS, format, type QuantityKind } from '#shared/units/quantity.ts';

/** What a formula is told, or what it gives. A null value is not known. */
export interface Figure {
  what: ReactNode;
  value: string | null;
  /** By this a test finds it. */
  id?: string;
  isResult?: boolean;
}

/** A link worked out, with the names of its two beers and the reader's units. */
export interface Work extends Workings {
  earlier: string;
  later: string;
  units: UnitPrefs;
}

export interface ScienceSection {
  id: string;
  title: string;
  /** What is worked out, and for what. */
  lead: string;
  formula: ReactNode;
  source: string;
  /** How far it may be out. */
  interval: string;
  /** Where it does not hold. */
  limits: string;
  figures: (work: Work) => Figure[];
}

/** In the reader's units and, where those differ, in the formula's. */
export function inBoth(kind: QuantityKind, value: number | undefined, units: UnitPrefs) {
  if (value === undefined) return null;
  const own = format(kind, value, units);
  const asWorked = format(kind, value, DEFAULT_UNITS);
  return own === asWorked ? own : `${own} (${asWorked})`;
}

/** A number with so many digits that matter. */
export const digits = (value: number | undefined, count = 3): string | null =>
  value === undefined ? null : String(Number(value.toPrecision(count))).replace('-', '−');

/** Both ways of saying how dense a wort is. */
export const plato = (value: number | undefined): string | null =>
  value === undefined ? null : `${value.toFixed(2).replace('-', '−')} °P`;

/** "0.84 million". */
export const millions = (cells: number | undefined): string | null =>
  cells === undefined ? null : `${digits(cells / 1e6)} million`;

export const percent = (share: number | undefined): string | null =>
  share === undefined ? null : `${digits(share * 100)} %`;

/** A coefficient with a sign that stands clear of it. */
export const signed = (value: number): string => String(value).replace('-', '− ');

/** What a formula gives. */
export const result = (what: ReactNode, value: string | null, id: string): Figure => ({
  what,
  value,
  id,
  isResult: true,
});
