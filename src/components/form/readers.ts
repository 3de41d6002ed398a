import type { TypedText, UnitPrefs } from '#shared/api/units.ts';
import { parse, shown, unitOf, type QuantityKind } from '#shared/units/quantity.ts';
import { isPlain, plainUnit, readPlain, writePlain, type PlainKind } from './plainNumbers.ts';

export type NumberKind = QuantityKind | PlainKind;

export type Reading = { ok: true; value: number } | { ok: false; why: string };

/** How a number is read from what was typed, and written back. */
export interface Reader {
  unit: string;
  read: (text: string) => Reading;
  write: (value: number, typed: TypedText | undefined) => string;
}

export function readerOf(kind: NumberKind, prefs: UnitPrefs): Reader {
  if (isPlain(kind))
    return {
      unit: plainUnit(kind),
      read: (text) => readPlain(kind, text),
      write: (value, typed) => writeAsTyped(kind, value, typed),
    };
  return {
    unit: unitOf(kind, prefs),
    read: (text) => parse(kind, text, prefs),
    write: (value, typed) => shown(kind, value, typed, prefs),
  };
}

/** What was typed, while it still says the stored number. */
function writeAsTyped(kind: PlainKind, value: number, typed: TypedText | undefined): string {
  if (typed) {
    const reading = readPlain(kind, typed.text);
    if (reading.ok && Math.abs(reading.value - value) < 1e-9) return typed.text;
  }
  return writePlain(kind, value);
}
