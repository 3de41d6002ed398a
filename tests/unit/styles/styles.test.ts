import { expect, test } from 'vitest';
import { styleNamed, STYLES } from '#shared/styles/styles.ts';
import { abv } from '#shared/units/alcohol.ts';

test('every style has a name of its own', () => {
  expect(new Set(STYLES.map((style) => style.name.toLowerCase())).size).toBe(STYLES.length);
});

test.each(STYLES.map((style) => [style.name, style] as const))('%s hangs together', (_n, style) => {
  for (const range of [style.og, style.fg, style.ibu, style.srm, style.abv])
    expect(range[0]).toBeLessThan(range[1]);
  expect(style.fg[1]).toBeLessThan(style.og[0]);
  // The middle of the gravities gives an alcohol within the range that is named.
  const middle = abv((style.og[0] + style.og[1]) / 2, (style.fg[0] + style.fg[1]) / 2);
  expect(middle).toBeGreaterThan(style.abv[0]);
  expect(middle).toBeLessThan(style.abv[1]);
});

test('a style is found however it is capitalised; own words are none', () => {
  expect(styleNamed(' pale ALE ')?.name).toBe('Pale ale');
  expect(styleNamed('Harvest beer')).toBeUndefined();
});
