import { describe, expect, test } from 'vitest';
import { ale, check, missingFor, standing, type Case } from '../../support/links.ts';

const srm = (a: number, b: number, more: Partial<Case> = {}) =>
  check({ a: ale('a', 1.05, a, 25), b: ale('b', 1.05, b, 25), ...more });
const at = (...of: Parameters<typeof srm>) => standing(srm(...of), 'light-to-dark');

describe('light-to-dark', () => {
  test('up to 3 SRM darker nobody looks at the shift', () => {
    const anyShift = { rules: { colourShiftMind: 0.2, colourShiftHold: 0.2 } };
    expect(at(6.99, 4, anyShift)).toBe('passed');
    expect(at(6.994, 4, anyShift)).toBe('passed');
    expect(at(7, 4, anyShift)).toBe('hold');
    expect(at(6.995, 4, anyShift)).toBe('hold');
  });

  test('the shift itself decides between pour, mind and hold', () => {
    const shift = srm(30, 6).blend.deltaE00 ?? 0;
    const hold = { colourShiftMind: shift - 0.01, colourShiftHold: shift - 1e-6 };
    const mind = { colourShiftMind: shift - 1e-6, colourShiftHold: shift + 1e-6 };
    const none = { colourShiftMind: shift + 1e-6, colourShiftHold: shift + 1 };
    expect(at(30, 6, { rules: hold })).toBe('hold');
    expect(at(30, 6, { rules: mind })).toBe('mind');
    expect(at(30, 6, { rules: none })).toBe('passed');
  });

  test('a beer that is darker by 30 SRM is seen, unless hardly any of it is kept', () => {
    expect(at(34, 4)).toBe('hold');
    expect(at(34, 4, { pour: { keepL: 0.05 } })).toBe('passed');
    expect(at(34, 4, { pour: { keepL: 0 } })).toBe('passed');
  });

  test('what is known may decide without the rest', () => {
    const { volumeL: _v, ...noVolume } = ale('a', 1.05, 6, 25);
    const pale = ale('b', 1.05, 4, 25);
    expect(standing(check({ a: noVolume, b: pale }), 'light-to-dark')).toBe('passed');
    const dark = check({ a: { ...noVolume, srm: 30 }, b: pale });
    expect(missingFor(dark, 'light-to-dark')).toEqual(['volumeL']);
    const { srm: _s, ...noColour } = pale;
    expect(missingFor(check({ a: noVolume, b: noColour }), 'light-to-dark')).toEqual(['srm']);
  });
});
