import { wcagContrast } from 'culori';
import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

/**
 * WCAG 2.2 asks 4.5 of text (1.4.3) and 3 of shapes that carry meaning (1.4.11). The ratio is
 * computed by culori from the tokens as they stand in the stylesheet.
 */
const css = readFileSync(new URL('../../../src/styles.css', import.meta.url), 'utf8');
const tokens = new Map(
  [...css.matchAll(/--([\w-]+): light-dark\((#\w+), (#\w+)\);/g)].map((found) => [
    found[1] ?? '',
    { light: found[2] ?? '', dark: found[3] ?? '' },
  ]),
);

const TEXT: readonly (readonly [string, string])[] = [
  ...['stone', 'paper', 'white', 'bench'].flatMap((ground) => [
    ['ink', ground] as const,
    ['ink2', ground] as const,
  ]),
  ['ink2', 'bottle-l'],
  ['ink2', 'line2'],
  ['ink3', 'white'],
  ['bottle', 'stone'],
  ['bottle', 'bottle-l'],
  ['on-bottle', 'bottle'],
  ['on-bar', 'bar'],
  ['on-bar2', 'bar'],
  ['on-cake', 'cake'],
  ...['pour', 'mind', 'hold'].flatMap((verdict) => [
    [verdict, `${verdict}-l`] as const,
    [verdict, 'stone'] as const,
    [verdict, 'paper'] as const,
    ['in-badge', verdict] as const,
  ]),
];
const SHAPES: readonly (readonly [string, string])[] = [
  ['edge', 'stone'],
  ['edge', 'paper'],
  ['edge', 'white'],
  ['cake-dd', 'stone'],
  ['vline', 'stone'],
];

describe.each(['light', 'dark'] as const)('contrast in the %s theme', (theme) => {
  const ratio = (over: string, ground: string) =>
    wcagContrast(tokens.get(over)?.[theme] ?? '', tokens.get(ground)?.[theme] ?? '');

  it.each(TEXT)('reads %s on %s', (over, ground) => {
    expect(ratio(over, ground)).toBeGreaterThanOrEqual(4.5);
  });
  it.each(SHAPES)('shows %s on %s', (over, ground) => {
    expect(ratio(over, ground)).toBeGreaterThanOrEqual(3);
  });
});
