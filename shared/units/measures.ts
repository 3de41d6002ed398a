import { ebcFromSrm, srmFromEbc } from './colour.ts';
import { apparentExtract, sgFromPlato } from './gravity.ts';
import { KG_PER_OUNCE, KG_PER_POUND } from './mass.ts';
import { celsiusFromFahrenheit, fahrenheitFromCelsius } from './temperature.ts';
import { LITRES_PER_FLUID_OUNCE, LITRES_PER_GALLON } from './volume.ts';

/** A unit that people read and write, and its way from and to the one stored unit. */
export interface Unit {
  /** As it is written after a number; a gravity in SG stands alone. */
  symbol: string;
  /** What people type for it, in small letters without spaces. */
  spellings: readonly string[];
  from(stored: number): number;
  to(shown: number): number;
  /** Digits after the point that matter at this size, and whether zeros at the end are kept. */
  digits(size: number): number;
  keepZeros?: boolean;
  /** A number in this unit as an example. */
  example: string;
}

const scaled = (
  symbol: string,
  spellings: readonly string[],
  storedPerUnit: number,
  digits: (size: number) => number,
  example: string,
): Unit => ({
  symbol,
  spellings,
  from: (stored) => stored / storedPerUnit,
  to: (shown) => shown * storedPerUnit,
  digits,
  example,
});

const roughly = (size: number): number => (size < 10 ? 2 : size < 100 ? 1 : 0);
const finely = (size: number): number => (size < 0.1 ? 3 : 2);
const tenths = (): number => 1;
const tenthsIfSmall = (size: number): number => (size < 10 ? 1 : 0);

const GALLON = ['gal', 'gals', 'gallon', 'gallons', 'usgal', 'usgallons'];
const OUNCES_PER_GALLON = (KG_PER_OUNCE * 1000) / LITRES_PER_GALLON;

export const LITRE = scaled('L', ['l', 'litre', 'litres', 'liter', 'liters'], 1, roughly, '23');
export const GALLON_US = scaled('gal', GALLON, LITRES_PER_GALLON, roughly, '6');
export const MILLILITRE = scaled('mL', ['ml'], 0.001, tenthsIfSmall, '400');
export const FLUID_OUNCE = scaled('fl oz', ['floz'], LITRES_PER_FLUID_OUNCE, tenths, '14');
export const KILOGRAM = scaled('kg', ['kg'], 1, roughly, '1.5');
export const POUND = scaled('lb', ['lb', 'lbs', 'pound', 'pounds'], KG_PER_POUND, roughly, '3');
export const GRAM = scaled('g', ['g', 'gram', 'grams'], 0.001, tenthsIfSmall, '300');
export const OUNCE = scaled('oz', ['oz', 'ounce', 'ounces'], KG_PER_OUNCE, tenths, '10');
export const GRAM_PER_LITRE = scaled('g/L', ['g/l'], 1, roughly, '2.5');
export const OUNCE_PER_GALLON = scaled('oz/gal', ['oz/gal'], OUNCES_PER_GALLON, finely, '0.3');
export const SRM = scaled('SRM', ['srm'], 1, tenths, '7');
export const EBC: Unit = {
  ...scaled('EBC', ['ebc'], 1, (size) => (size < 20 ? 1 : 0), '14'),
  from: ebcFromSrm,
  to: srmFromEbc,
};
export const IBU = scaled('IBU', ['ibu'], 1, tenths, '38');
export const PER_CENT = scaled('%', ['%'], 1, tenths, '5.2');
export const CELSIUS = scaled('°C', ['°c', 'c', 'ºc'], 1, tenths, '20');
export const FAHRENHEIT: Unit = {
  ...scaled('°F', ['°f', 'f', 'ºf'], 1, tenths, '68'),
  from: fahrenheitFromCelsius,
  to: celsiusFromFahrenheit,
};
/** Steps of temperature: no zero point takes part. */
export const CELSIUS_STEP = CELSIUS;
export const FAHRENHEIT_STEP = scaled('°F', FAHRENHEIT.spellings, 1 / 1.8, tenths, '4');
export const SPECIFIC_GRAVITY: Unit = {
  ...scaled('SG', ['sg'], 1, () => 3, '1.052'),
  // Written without its point, as on a hydrometer: 1052.
  to: (shown) => (shown >= 900 && shown <= 1300 ? shown / 1000 : shown),
  keepZeros: true,
};
export const PLATO: Unit = {
  ...scaled('°P', ['°p', 'p', 'ºp', 'plato'], 1, tenths, '12.9'),
  from: apparentExtract,
  to: (shown) => (shown >= 900 && shown <= 1300 ? shown / 1000 : sgFromPlato(shown)),
  keepZeros: true,
};
/** Typed only: "52 points" is 1.052. */
export const GRAVITY_POINTS: Unit = {
  ...scaled('points', ['points', 'pts', 'pt'], 1, tenths, '52'),
  from: (sg) => (sg - 1) * 1000,
  to: (shown) => 1 + shown / 1000,
};
