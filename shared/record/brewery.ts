import type { Brewery } from '../api/brewery.ts';
import type { UnitPrefs } from '../api/units.ts';
import { factChanges, factSentence, type FactTable } from './facts.ts';
import type { Told } from './sentences.ts';

const SYSTEMS: Record<UnitPrefs['system'], string> = { metric: 'litres', us: 'US gallons' };
const GRAVITIES: Record<UnitPrefs['gravity'], string> = { sg: 'SG', plato: '°P' };
const COLOURS: Record<UnitPrefs['colour'], string> = { srm: 'SRM', ebc: 'EBC' };
const DEGREES: Record<UnitPrefs['temperature'], string> = { c: '°C', f: '°F' };

const text = (label: string) => ({ label, say: (value: unknown) => String(value) });
const wordOf = (label: string, words: Record<string, string>) => ({
  label,
  say: (value: unknown) => words[String(value)] ?? null,
});

const TABLE: FactTable = {
  name: text('name'),
  timeZone: text('time zone'),
  currency: text('currency'),
  system: wordOf('unit of volumes', SYSTEMS),
  gravity: wordOf('unit of gravities', GRAVITIES),
  colour: wordOf('unit of colours', COLOURS),
  temperature: wordOf('unit of temperatures', DEGREES),
};

/** "Set the currency of the brewery from USD to EUR"; "Renamed the brewery from … to …". */
export function tellBrewery(before: Brewery, after: Brewery): Told {
  const flat = ({ units, ...row }: Brewery) => ({ ...row, ...units });
  const facts = factChanges(TABLE, flat(before), flat(after));
  const renamed = facts.length === 1 && before.name !== after.name;
  const what = renamed
    ? `Renamed the brewery from ${before.name} to ${after.name}`
    : factSentence('of the brewery', 'Changed the brewery', facts);
  return { what, facts };
}
