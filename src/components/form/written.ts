import type { Typed, TypedText, UnitPrefs } from '#shared/api/units.ts';
import { readerOf, type NumberKind } from './readers.ts';

/**
 * A number field of a form: what was typed, as it was typed, with the number it means. While the
 * text cannot be read the value is null and `why` says what to write.
 */
export interface Written {
  kind: NumberKind;
  text: string;
  unit: string;
  value: number | null;
  why: string | null;
  /** What to store beside the number; absent until somebody typed it. */
  typed: TypedText | undefined;
  /** Units in which it is shown and read. */
  prefs: UnitPrefs;
}

/** A field as it opens: the text that was once typed if it still agrees with the stored number. */
export function written(
  kind: NumberKind,
  value: number | null,
  prefs: UnitPrefs,
  typed?: TypedText,
): Written {
  const reader = readerOf(kind, prefs);
  const text = value === null ? '' : reader.write(value, typed);
  return { kind, text, unit: reader.unit, value, why: null, typed, prefs };
}

/** A field after somebody typed. Empty is no number, and no fault. */
export function rewrite(before: Written, text: string, prefs: UnitPrefs): Written {
  const reader = readerOf(before.kind, prefs);
  const typed = { text: text.trim(), unit: reader.unit };
  const start = { ...before, text, unit: reader.unit, typed, prefs };
  if (text.trim() === '') return { ...start, value: null, why: null };
  const reading = reader.read(text);
  return reading.ok
    ? { ...start, value: reading.value, why: null }
    : { ...start, value: null, why: reading.why };
}

export const isWritten = (value: unknown): value is Written =>
  typeof value === 'object' &&
  value !== null &&
  'why' in value &&
  'text' in value &&
  'kind' in value;

export interface Collected {
  /** The form's values with every number field as its number, and `typed` filled in. */
  body: unknown;
  typed: Typed;
  /** What is wrong with fields that could not be read, by path. */
  faults: { path: string; why: string }[];
}

/** Turns a form's values into the shape of the contract. */
export function collect(values: unknown): Collected {
  const typed: Typed = {};
  const faults: Collected['faults'] = [];
  const walk = (value: unknown, path: string): unknown => {
    if (isWritten(value)) {
      if (value.why !== null) faults.push({ path, why: value.why });
      else if (value.value !== null && value.typed) typed[path] = value.typed;
      return value.value;
    }
    const within = (key: string | number) => (path === '' ? String(key) : `${path}.${key}`);
    if (Array.isArray(value)) return value.map((item, index) => walk(item, within(index)));
    if (typeof value === 'object' && value !== null)
      return Object.fromEntries(
        Object.entries(value).map(([key, item]) => [key, walk(item, within(key))]),
      );
    return value;
  };
  return { body: walk(values, ''), typed, faults };
}
