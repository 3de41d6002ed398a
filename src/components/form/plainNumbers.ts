import { minorDigits } from '#shared/units/money.ts';

/** Numbers of a form that have no choice of unit. Money is named by its digits after the point. */
export type PlainKind = 'days' | 'count' | 'number' | 'percent' | 'money0' | 'money2' | 'money3';

interface Plain {
  unit: string;
  /** What one of the field is in the stored unit. */
  factor: number;
  /** Digits that are written after the point; null: as many as there are. */
  digits: number | null;
  whole: boolean;
  why: string;
}

const money = (digits: number, example: string): Plain => ({
  unit: '',
  factor: 10 ** digits,
  digits,
  whole: false,
  why: `Write an amount, such as ${example}`,
});

const PLAIN: Record<PlainKind, Plain> = {
  days: { unit: 'days', factor: 1, digits: null, whole: true, why: 'Write whole days, such as 14' },
  count: { unit: '', factor: 1, digits: null, whole: true, why: 'Write a whole number, such as 5' },
  number: {
    unit: '',
    factor: 1,
    digits: null,
    whole: false,
    why: 'Write a number, such as 1.5',
  },
  percent: {
    unit: '%',
    factor: 0.01,
    digits: null,
    whole: false,
    why: 'Write a percentage, such as 75',
  },
  money0: money(0, '7'),
  money2: money(2, '6.50'),
  money3: money(3, '6.500'),
};

export const isPlain = (kind: string): kind is PlainKind => Object.hasOwn(PLAIN, kind);
export const plainUnit = (kind: PlainKind) => PLAIN[kind].unit;

export function moneyKind(currency: string): PlainKind {
  const digits = minorDigits(currency);
  return digits === 0 ? 'money0' : digits === 3 ? 'money3' : 'money2';
}

export function readPlain(kind: PlainKind, text: string) {
  const { factor, digits, whole, why } = PLAIN[kind];
  const number = numberOf(text);
  if (number === null || (whole && !Number.isInteger(number))) return { ok: false, why } as const;
  const value = number * factor;
  return { ok: true, value: digits === null ? value : Math.round(value) } as const;
}

export function writePlain(kind: PlainKind, value: number): string {
  const { factor, digits } = PLAIN[kind];
  return digits === null
    ? String(Math.round((value / factor) * 1e6) / 1e6)
    : (value / factor).toFixed(digits);
}

/** A decimal comma is as good as a point; a sign of per cent or money is left out of account. */
function numberOf(text: string): number | null {
  const found = /^\s*\p{Sc}?\s*([+-]?\d+(?:[.,]\d+)?|[.,]\d+)\s*(?:%|days?|\p{Sc})?\s*$/u.exec(
    text,
  );
  return found?.[1] === undefined ? null : Number(found[1].replace(',', '.'));
}
