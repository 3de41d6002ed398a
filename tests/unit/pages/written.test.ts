import { describe, expect, it } from 'vitest';
import type { UnitPrefs } from '#shared/api/units.ts';
import { collect, rewrite, written } from '../../../src/components/form/written.ts';

const METRIC: UnitPrefs = { system: 'metric', gravity: 'sg', colour: 'srm', temperature: 'c' };
const US: UnitPrefs = { system: 'us', gravity: 'plato', colour: 'ebc', temperature: 'f' };

describe('a number field', () => {
  it('keeps the text that was typed, decimal comma and all', () => {
    const field = rewrite(written('gravity', null, METRIC), '1,052', METRIC);
    expect(field).toMatchObject({ text: '1,052', value: 1.052, why: null });
    expect(field.typed).toEqual({ text: '1,052', unit: 'SG' });
  });

  it('opens with the typed text while it still says the stored number', () => {
    const typed = { text: '23,0', unit: 'L' };
    expect(written('volume', 23, METRIC, typed).text).toBe('23,0');
    expect(written('volume', 21, METRIC, typed).text).toBe('21');
  });

  it('opens in the units of another person and keeps the first one’s text if untouched', () => {
    const typed = { text: '20', unit: '°C' };
    const field = written('temperature', 20, US, typed);
    expect(field.text).toBe('68');
    expect(collect({ fermentC: field }).typed).toEqual({ fermentC: typed });
  });

  it('says what to write when the text is no number, and loses nothing', () => {
    const field = rewrite(written('volume', 23, METRIC), 'a bucket', METRIC);
    expect(field.text).toBe('a bucket');
    expect(field.value).toBeNull();
    expect(field.why).toMatch(/number/i);
  });

  it('takes an empty field for no number and no fault', () => {
    expect(rewrite(written('volume', 23, METRIC), ' ', METRIC)).toMatchObject({
      value: null,
      why: null,
    });
  });

  it.each([
    ['money2', '8,50', 850],
    ['money2', '€8.5', 850],
    ['money0', '900', 900],
    ['money3', '1.25', 1250],
    ['percent', '75 %', 0.75],
    ['days', '14 days', 14],
  ] as const)('reads %s "%s" as %d', (kind, text, value) => {
    expect(rewrite(written(kind, null, METRIC), text, METRIC).value).toBeCloseTo(value, 9);
  });

  it.each([
    ['days', '14.5'],
    ['count', 'four'],
    ['money2', '8.50 each'],
  ] as const)('refuses %s "%s"', (kind, text) => {
    expect(rewrite(written(kind, null, METRIC), text, METRIC).why).not.toBeNull();
  });
});

describe('collecting a form', () => {
  it('turns every field into its number, nested ones too, and gathers texts and faults', () => {
    const values = {
      name: 'Jetty Pale',
      og: rewrite(written('gravity', null, METRIC), '1.052', METRIC),
      fg: rewrite(written('gravity', null, METRIC), 'low', METRIC),
      dryHops: [
        {
          gramsPerLitre: rewrite(written('hopRate', null, METRIC), '2,5', METRIC),
          contained: 'loose',
        },
      ],
    };
    const { body, typed, faults } = collect(values);
    expect(body).toEqual({
      name: 'Jetty Pale',
      og: 1.052,
      fg: null,
      dryHops: [{ gramsPerLitre: 2.5, contained: 'loose' }],
    });
    expect(typed).toEqual({
      og: { text: '1.052', unit: 'SG' },
      'dryHops.0.gramsPerLitre': { text: '2,5', unit: 'g/L' },
    });
    expect(faults.map((fault) => fault.path)).toEqual(['fg']);
  });
});
