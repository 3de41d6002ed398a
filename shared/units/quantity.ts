import type { Typed, UnitPrefs } from '../api/units.ts';
import * as m from './measures.ts';
import type { Unit } from './measures.ts';
import { readNumber, writeNumber } from './numberText.ts';

/** A kind of quantity: the stored unit is named; people see the unit of their own choice. */
interface Quantity {
  choose(prefs: UnitPrefs): Unit;
  /** The unit of large amounts, where `choose` gives one for small parts. */
  large?(prefs: UnitPrefs): Unit;
  /** Every unit that may be typed. */
  accepts: readonly Unit[];
}

const system =
  (metric: Unit, us: Unit) =>
  (prefs: UnitPrefs): Unit =>
    prefs.system === 'us' ? us : metric;

const VOLUMES = [m.LITRE, m.MILLILITRE, m.GALLON_US, m.FLUID_OUNCE];
const MASSES = [m.KILOGRAM, m.GRAM, m.POUND, m.OUNCE];

/** Stored in: litres, SG, SRM, IBU, °C, g/L, kg, % by volume. */
export const QUANTITIES = {
  volume: { choose: system(m.LITRE, m.GALLON_US), accepts: VOLUMES },
  /** A part of a cake, litres. */
  smallVolume: {
    choose: system(m.MILLILITRE, m.FLUID_OUNCE),
    large: system(m.LITRE, m.GALLON_US),
    accepts: VOLUMES,
  },
  mass: { choose: system(m.KILOGRAM, m.POUND), accepts: MASSES },
  /** A part of a cake, kg. */
  smallMass: {
    choose: system(m.GRAM, m.OUNCE),
    large: system(m.KILOGRAM, m.POUND),
    accepts: MASSES,
  },
  hopRate: {
    choose: system(m.GRAM_PER_LITRE, m.OUNCE_PER_GALLON),
    accepts: [m.GRAM_PER_LITRE, m.OUNCE_PER_GALLON],
  },
  gravity: {
    choose: (prefs) => (prefs.gravity === 'plato' ? m.PLATO : m.SPECIFIC_GRAVITY),
    accepts: [m.SPECIFIC_GRAVITY, m.PLATO, m.GRAVITY_POINTS],
  },
  colour: {
    choose: (prefs) => (prefs.colour === 'ebc' ? m.EBC : m.SRM),
    accepts: [m.SRM, m.EBC],
  },
  bitterness: { choose: () => m.IBU, accepts: [m.IBU] },
  alcohol: { choose: () => m.PER_CENT, accepts: [m.PER_CENT] },
  temperature: {
    choose: (prefs) => (prefs.temperature === 'f' ? m.FAHRENHEIT : m.CELSIUS),
    accepts: [m.CELSIUS, m.FAHRENHEIT],
  },
  /** A difference of two temperatures, °C. */
  temperatureStep: {
    choose: (prefs) => (prefs.temperature === 'f' ? m.FAHRENHEIT_STEP : m.CELSIUS_STEP),
    accepts: [m.CELSIUS_STEP, m.FAHRENHEIT_STEP],
  },
} as const satisfies Record<string, Quantity>;

export type QuantityKind = keyof typeof QUANTITIES;

export const QUANTITY_KINDS = Object.keys(QUANTITIES) as QuantityKind[];

/** Metric, SG, SRM, °C. */
export const DEFAULT_UNITS: UnitPrefs = {
  system: 'metric',
  gravity: 'sg',
  colour: 'srm',
  temperature: 'c',
};

const quantity = (kind: QuantityKind): Quantity => QUANTITIES[kind];

/** Symbol of the unit that a field of this kind shows and reads: `L`, `gal`, `SG`, `°P` … */
export const unitOf = (kind: QuantityKind, prefs: UnitPrefs): string =>
  quantity(kind).choose(prefs).symbol;

const write = (unit: Unit, value: number): string => {
  const shown = unit.from(value);
  return writeNumber(shown, unit.digits(Math.abs(shown)), unit.keepZeros === true);
};

/** A stored value as a field shows it: the digits that matter in the field's unit, no unit. */
export const formatBare = (kind: QuantityKind, value: number, prefs: UnitPrefs): string =>
  write(quantity(kind).choose(prefs), value);

/**
 * A stored value for a sentence: number and unit, "23 L", "12.9 °P", "400 mL". An SG stands alone,
 * as the trade writes it: "1.052". A large amount of a small kind takes the larger unit: "1.25 L".
 */
export function format(kind: QuantityKind, value: number, prefs: UnitPrefs): string {
  const { choose, large } = quantity(kind);
  const big = large?.(prefs);
  const unit = big && Math.abs(big.from(value)) >= 1 ? big : choose(prefs);
  const text = write(unit, value).replace('-', '−');
  if (unit === m.SPECIFIC_GRAVITY) return text;
  return `${text} ${unit.symbol}`;
}

export type Parsed = { ok: true; value: number } | { ok: false; why: string };

/**
 * Reads typed text into the stored unit. Point and comma are both decimal ("1,052"); a unit may be
 * typed in place of the field's own ("5 gal"); a gravity may lack its point ("1052"). Text that is no
 * single number, or whose unit does not fit, is refused with what to write. Ranges are the
 * contracts' to check.
 */
export function parse(kind: QuantityKind, text: string, prefs: UnitPrefs): Parsed {
  const { choose, accepts } = quantity(kind);
  const field = choose(prefs);
  const read = readNumber(text);
  if (!read) return { ok: false, why: `Write a number, such as ${field.example}` };
  const unit =
    read.unit === '' || field.spellings.includes(read.unit)
      ? field
      : accepts.find((known) => known.spellings.includes(read.unit));
  return unit
    ? { ok: true, value: unit.to(read.number) }
    : { ok: false, why: `Write it in ${field.symbol}, such as ${field.example}` };
}

/**
 * Text of a field: what was typed, while it still says the stored value in the unit that the field
 * shows now; else the stored value's own digits. Null is an empty field.
 */
export function shown(
  kind: QuantityKind,
  value: number | null,
  typed: Typed[string] | null | undefined,
  prefs: UnitPrefs,
): string {
  if (value === null) return '';
  if (typed && typed.unit === unitOf(kind, prefs)) {
    const parsed = parse(kind, typed.text, prefs);
    if (parsed.ok && Math.abs(parsed.value - value) <= 1e-9 * Math.max(1, Math.abs(value)))
      return typed.text;
  }
  return formatBare(kind, value, prefs);
}
