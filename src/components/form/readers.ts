import type { Typed, UnitPrefs } from '#shared/api/units.ts';
import { parse, shown, unitOf, type QuantityKind } from '#shared/units/quantity.ts';

export type TypedText = Typed[string];

/** Numbers of a form that have no choice of unit. */
export type PlainKind = 'days' | 'count' | 'percent' | 'money';
export type NumberKind = QuantityKind | PlainKind;

export type Reading = { ok: true; value: number } | { ok: false; why: string };

/** How a number is read from what was typed, and written back. */
export interface Reader {
  unit: string;
  read: (text: string) => Reading;
  write: (value: number, typed: TypedText | undefined) => string;
}

const PLAIN: Record<PlainKind, { unit: string; scale: number; why: string; whole: boolean }> = {
  days: { unit: 'days', scale: 1, why: 'Write whole days, such as 14', whole: true },
  count: { unit: '', scale: 1, why: 'Write a whole number, such as 5', whole: true },
  percent: { unit: '%', scale: 100, why: 'Write a percentage, such as 75', whole: false },
  money: { unit: '', scale: 0.01, why: 'Write an amount, such as 6.50', whole: false },
};

export function readerOf(kind: NumberKind, prefs: UnitPrefs): Reader {
  if (isPlain(kind)) return plainReader(kind);
  return {
    unit: unitOf(kind, prefs),
    read: (text) => parse(kind, text, prefs),
    write: (value, typed) => shown(kind, value, typed, prefs),
  };
}

const isPlain = (kind: NumberKind): kind is PlainKind => Object.hasOwn(PLAIN, kind);

function plainReader(kind: PlainKind): Reader {
  const { unit, scale, why, whole } = PLAIN[kind];
  return {
    unit,
    read: (text) => {
      const number = plainNumber(text);
      if (number === null || (whole && !Number.isInteger(number))) return { ok: false, why };
      const value = number / scale;
      return { ok: true, value: kind === 'money' ? Math.round(value) : value };
    },
    write: (value, typed) => {
      if (typed && typed.unit === unit) {
        const number = plainNumber(typed.text);
        if (number !== null && Math.abs(number / scale - value) < 1e-9) return typed.text;
      }
      return kind === 'money' ? (value / 100).toFixed(2) : trimmed(value * scale);
    },
  };
}

/** A decimal comma is as good as a point; a unit behind the number is left out of account. */
function plainNumber(text: string): number | null {
  const found = /^\s*([+-]?\d+(?:[.,]\d+)?|[.,]\d+)\s*(?:%|days?|\p{Sc})?\s*$/u.exec(text);
  return found?.[1] === undefined ? null : Number(found[1].replace(',', '.'));
}

const trimmed = (value: number) => String(Math.round(value * 1e6) / 1e6);
