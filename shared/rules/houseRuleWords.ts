import type { UnitPrefs } from '../api/units.ts';
import { format } from '../units/quantity.ts';
import { HOUSE_RULES, type HouseRuleKey } from './houseRules.ts';

/** Each threshold as it is called outside of its sentence. */
export const HOUSE_RULE_WORDS: Record<HouseRuleKey, string> = {
  darkSrm: 'colour gap that counts',
  colourShiftMind: 'colour shift for a Mind',
  colourShiftHold: 'colour shift for a Hold',
  bitterGapMind: 'bitterness gap for a Mind',
  bitterGapHold: 'bitterness gap for a Hold',
  bitterShiftMind: 'added bitterness for a Mind',
  bitterShiftHold: 'added bitterness for a Hold',
  bitterShiftAlone: 'added bitterness for a Hold at any gap',
  hopsMind: 'hops in the cake for a Mind',
  hopsHoldPlain: 'hops in the cake for a Hold under an unhopped beer',
  hopsHold: 'hops in the cake for a Hold under any beer',
  baggedShare: 'share that bagged hops count',
  jumpMind: 'step up in gravity for a Mind',
  jumpStrong: 'step up in gravity for a strong Mind',
  jumpHold: 'step up in gravity for a Hold',
  fallMind: 'step down in gravity for a Mind',
  fallHold: 'step down in gravity for a Hold',
  fallHoldFromOg: 'gravity of the earlier beer for that Hold',
  freeMind: 'headspace for a Mind',
  freeMindStrong: 'headspace of strong beer for a Mind',
  freeBlowOff: 'headspace with a blow-off tube for a Mind',
  freeHold: 'headspace for a Hold',
  leftAboveShare: 'beer left above the cake',
  pourAboveMind: 'wort above its window for a Mind',
  pourBelowMind: 'wort below its window for a Mind',
  tiredOgMind: 'gravity of the earlier beer for a Mind',
  tiredOgHold: 'gravity of the earlier beer for a Hold',
  tiredAbvMind: 'alcohol of the earlier beer for a Mind',
  tiredAbvHold: 'alcohol of the earlier beer for a Hold',
  outOfRangeHold: 'degrees out of range for a Hold',
  generations: 'generation limit',
  generationsFrom15P: 'generation limit after 15 °P',
  generationsFrom18P: 'generation limit after 18 °P',
  holdAfter: 'generations above the limit for a Hold',
  survivalMind: 'surviving cells for a Mind',
  survivalHold: 'surviving cells for a Hold',
  warmWaitHoldDays: 'warm wait for a Hold',
  underBeerMind: 'time under ale for a Mind',
  underBeerHold: 'time under ale for a Hold',
  underBeerMindLager: 'time under lager for a Mind',
  underBeerHoldLager: 'time under lager for a Hold',
  pitchMind: 'yeast for a Mind',
  pitchHold: 'yeast for a Hold',
  characterMind: 'yeast of marked character for a Mind',
  beersSinceCleaning: 'beers since the vessel was cleaned',
  warmerCakeMind: 'cake above the wort for a Mind',
  readingMinutes: 'age of a temperature reading',
};

/** A threshold with its unit, as a person reads it. `null` (a jump's hold) is "never". */
export function houseRuleValue(key: HouseRuleKey, value: number | null, units: UnitPrefs): string {
  if (value === null) return 'never';
  const number = String(Math.round(value * 1000) / 1000);
  const { unit } = HOUSE_RULES[key];
  switch (unit) {
    case 'SRM':
      return format('colour', value, units);
    case 'IBU':
      return format('bitterness', value, units);
    case 'g/L':
      return format('hopRate', value, units);
    case 'SG':
      return format('gravity', value, units);
    case '°C':
      return format('temperatureStep', value, units);
    case '%':
      return format('alcohol', value, units);
    case 'share':
      return `${Math.round(value * 1000) / 10} %`;
    case 'ΔE00':
      return `ΔE ${number}`;
    case '× need':
      return `${number} times the need`;
    case 'days':
    case 'generations':
    case 'beers':
    case 'minutes':
      return `${number} ${value === 1 ? unit.replace(/s$/, '') : unit}`;
    case 'points':
      return `${number} points`;
  }
}
