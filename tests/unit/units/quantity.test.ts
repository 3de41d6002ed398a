import { describe, expect, test } from 'vitest';
import {
  DEFAULT_UNITS,
  format,
  formatBare,
  parse,
  shown,
  unitOf,
  type QuantityKind,
} from '#shared/units/quantity.ts';

const METRIC = DEFAULT_UNITS;
const US = { system: 'us', gravity: 'plato', colour: 'ebc', temperature: 'f' } as const;

describe('sentences', () => {
  test.each<[QuantityKind, number, string, string]>([
    ['volume', 23, '23 L', '6.08 gal'],
    ['volume', 22.5, '22.5 L', '5.94 gal'],
    ['volume', 1000, '1000 L', '264 gal'],
    ['smallVolume', 0.4, '400 mL', '13.5 fl oz'],
    ['smallVolume', 1.25, '1.25 L', '42.3 fl oz'],
    ['smallVolume', 4, '4 L', '1.06 gal'],
    ['mass', 1.5, '1.5 kg', '3.31 lb'],
    ['smallMass', 0.31, '310 g', '10.9 oz'],
    ['smallMass', 1.5, '1.5 kg', '3.31 lb'],
    ['hopRate', 2, '2 g/L', '0.27 oz/gal'],
    ['hopRate', 0.5, '0.5 g/L', '0.067 oz/gal'],
    ['gravity', 1.05, '1.050', '12.4 °P'],
    ['gravity', 1, '1.000', '0.0 °P'],
    ['gravity', 0.998, '0.998', '−0.5 °P'],
    ['colour', 7, '7 SRM', '13.8 EBC'],
    ['colour', 33, '33 SRM', '65 EBC'],
    ['bitterness', 21.24, '21.2 IBU', '21.2 IBU'],
    ['alcohol', 5.32, '5.3 %', '5.3 %'],
    ['temperature', 20, '20 °C', '68 °F'],
    ['temperature', -2, '−2 °C', '28.4 °F'],
    ['temperatureStep', 2, '2 °C', '3.6 °F'],
  ])('%s %d', (kind, value, metric, us) => {
    expect(format(kind, value, METRIC)).toBe(metric);
    expect(format(kind, value, US)).toBe(us);
  });
});

describe('typed text', () => {
  test.each(['1.052', '1,052', '1052', ' 1.052 SG', '52 points', '52pts'])('gravity %s', (text) => {
    const parsed = parse('gravity', text, METRIC);
    expect(parsed.ok && parsed.value).toBeCloseTo(1.052, 12);
  });

  test('in degrees Plato, with a unit or because the field shows it', () => {
    for (const parsed of [parse('gravity', '12,4 °P', METRIC), parse('gravity', '12.4', US)])
      expect(parsed.ok && parsed.value).toBeCloseTo(1.05, 3);
    expect(parse('gravity', '1052', US)).toEqual({ ok: true, value: 1.052 });
  });

  test('a unit may be typed in place of the field’s own', () => {
    expect(parse('volume', '5 gal', METRIC)).toEqual({ ok: true, value: 5 * 3.785411784 });
    expect(parse('volume', '19 litres', US)).toEqual({ ok: true, value: 19 });
    expect(parse('smallVolume', '400', METRIC)).toEqual({ ok: true, value: 0.4 });
    expect(parse('smallVolume', '0,4 l', METRIC)).toEqual({ ok: true, value: 0.4 });
    expect(parse('smallMass', '300', METRIC)).toEqual({ ok: true, value: 0.3 });
    expect(parse('temperature', '68F', METRIC)).toEqual({ ok: true, value: 20 });
    expect(parse('temperature', '−2', METRIC)).toEqual({ ok: true, value: -2 });
  });

  test.each(['abc', '1.0.5', '', '   ', '1e3', '1,000.5', '--2', '.', '5 5', 'NaN', 'Infinity'])(
    '"%s" is refused with what to write',
    (text) => {
      expect(parse('gravity', text, METRIC)).toEqual({
        ok: false,
        why: 'Write a number, such as 1.052',
      });
    },
  );

  test('a unit that does not fit is refused', () => {
    expect(parse('volume', '5 kg', METRIC)).toEqual({
      ok: false,
      why: 'Write it in L, such as 23',
    });
  });
});

describe('what a field shows', () => {
  test('what was typed, while the unit and the value agree', () => {
    expect(shown('gravity', 1.052, { text: '1,052', unit: 'SG' }, METRIC)).toBe('1,052');
    expect(shown('gravity', 1.052, { text: '1,052', unit: 'SG' }, US)).toBe('12.9');
    expect(shown('gravity', 1.06, { text: '1,052', unit: 'SG' }, METRIC)).toBe('1.060');
    expect(shown('volume', 23, { text: '23.0', unit: 'L' }, METRIC)).toBe('23.0');
    expect(shown('volume', 23, { text: 'twenty', unit: 'L' }, METRIC)).toBe('23');
  });
  test('its own digits without typed text, nothing where it is unknown', () => {
    expect(shown('volume', 23, null, METRIC)).toBe('23');
    expect(shown('volume', null, { text: '23', unit: 'L' }, METRIC)).toBe('');
    expect(formatBare('temperature', -2, METRIC)).toBe('-2');
    expect(unitOf('gravity', US)).toBe('°P');
  });
});
