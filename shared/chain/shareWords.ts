import type { UnitPrefs } from '../api/units.ts';
import { listed } from '../rules/say.ts';
import { format } from '../units/quantity.ts';
import type { Overstep } from './shares.ts';

/** Why a part cannot be kept, and what can: at the field of the kept part. */
export function overstepWords({ wholeL, others, leftL }: Overstep, units: UnitPrefs): string {
  const part = (litres: number) => format('smallVolume', litres, units);
  const whole = `the whole cake is about ${part(wholeL)}`;
  const bound = others.filter(({ litres }) => litres > 0);
  if (bound.length === 0)
    return `Keep at most ${part(leftL)}: ${whole}, and ${listed(others.map(({ name }) => name))} ${others.length === 1 ? 'shares' : 'share'} it`;
  const taken = listed(bound.map(({ name, litres }) => `${name} has ${part(litres)}`));
  return `Keep at most ${part(leftL)}: ${whole}, and ${taken} of it`;
}
