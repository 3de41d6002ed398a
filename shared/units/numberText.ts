/** A number as people type it: sign, digits with at most one point or comma, then maybe a unit. */
const NUMBER = /^([+-]?)(\d+(?:[.,]\d*)?|[.,]\d+)\s*([^\d\s.,+-][^\d.,+-]*)?$/;

export interface NumberText {
  number: number;
  /** In small letters without spaces; empty where none was typed. */
  unit: string;
}

/** Reads a typed number; null where the text is not one number. Point and comma are decimal. */
export function readNumber(text: string): NumberText | null {
  const found = NUMBER.exec(text.trim().replace(/[\u2212\u2013]/, '-'));
  if (!found) return null;
  const [, sign = '', digits = '', unit = ''] = found;
  const number = Number(digits.replace(',', '.')) * (sign === '-' ? -1 : 1);
  if (!Number.isFinite(number)) return null;
  return { number: number === 0 ? 0 : number, unit: unit.replace(/\s/g, '').toLowerCase() };
}

/** A number with this many digits after the point; zeros at the end only where they are kept. */
export function writeNumber(value: number, digits: number, keepZeros: boolean): string {
  const rounded = value.toFixed(digits);
  const text = keepZeros || digits === 0 ? rounded : rounded.replace(/\.?0+$/, '');
  return value < 0 && Number(text) === 0 ? text.replace('-', '') : text;
}
