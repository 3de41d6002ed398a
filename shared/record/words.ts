import type { UnitPrefs } from '../api/units.ts';
import { ADDITION_WORDS, ALLERGEN_WORDS, CULTURE_WORDS } from '../rules/words.ts';
import { listed } from '../rules/say.ts';
import { formatDay } from '../units/day.ts';
import { format, type QuantityKind } from '../units/quantity.ts';
import { formatMoney } from '../units/money.ts';
import type { FactWords } from './facts.ts';

/** What the sentences of a record need to know of the brewery. */
export interface Sayer {
  units: UnitPrefs;
  currency: string;
  /** Name of a yeast, a vessel or a batch; null where it is gone. */
  nameOf(id: string): string | null;
}

type Field = (label: string) => FactWords;

const field =
  (say: FactWords['say']): Field =>
  (label) => ({ label, say });

const text = (value: unknown): string | null =>
  typeof value === 'string' && value !== '' ? value : null;
const number = (value: unknown): number | null => (typeof value === 'number' ? value : null);

/** Fields by their kind, in the brewery's units. */
export function fieldsFor({ units, currency, nameOf }: Sayer) {
  const quantity = (kind: QuantityKind): Field =>
    field((value) => {
      const known = number(value);
      return known === null ? null : format(kind, known, units);
    });
  return {
    quantity,
    text: field(text),
    /** Long text: that it changed is enough. */
    note: field((value) => (text(value) === null ? null : `“${shortened(String(value))}”`)),
    day: field((value) => (text(value) === null ? null : formatDay(String(value)))),
    days: field((value) => counted(number(value), 'day', 'days')),
    count: field((value) => (number(value) === null ? null : String(value))),
    percent: field((value) => {
      const share = number(value);
      return share === null ? null : `${Math.round(share * 1000) / 10} %`;
    }),
    money: field((value) => {
      const minor = number(value);
      return minor === null ? null : formatMoney(minor, currency);
    }),
    yesNo: field((value) => (value === true ? 'yes' : value === false ? 'no' : null)),
    named: field((value) =>
      text(value) === null ? null : (nameOf(String(value)) ?? 'one that is gone'),
    ),
    allergens: field((value) => list(value, (one) => lookUp(ALLERGEN_WORDS, one))),
    cultures: field((value) => list(value, (one) => lookUp(CULTURE_WORDS, one))),
    additions: field((value) =>
      list(value, (one) => lookUp(ADDITION_WORDS, Reflect.get(Object(one), 'what'))),
    ),
    dryHops: field((value) =>
      list(value, (one) => {
        const { gramsPerLitre, contained, timing } = one as Record<string, unknown>;
        const rate = format('hopRate', Number(gramsPerLitre), units);
        return `${rate} ${String(contained)}${timing === 'on-cake' ? ' on the cake' : ''}`;
      }),
    ),
  };
}

const counted = (count: number | null, one: string, many: string): string | null =>
  count === null ? null : `${count} ${count === 1 ? one : many}`;

const lookUp = (words: Record<string, string>, key: unknown): string =>
  words[String(key)] ?? String(key);

function list(value: unknown, say: (one: unknown) => string): string | null {
  if (!Array.isArray(value)) return null;
  return value.length === 0 ? 'none' : listed(value.map(say));
}

const LONGEST = 60;
function shortened(value: string): string {
  const line = value.replace(/\s+/g, ' ');
  return line.length <= LONGEST ? line : `${line.slice(0, LONGEST - 1).trimEnd()}…`;
}
