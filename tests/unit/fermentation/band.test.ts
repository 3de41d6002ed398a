import { expect, test } from 'vitest';
import { expectedBand } from '#shared/fermentation/band.ts';

test.each(['ale', 'lager'] as const)('the band of an %s starts at the original gravity', (kind) => {
  const [first] = expectedBand(1.05, 1.012, kind, 14);
  expect(first?.low).toBeCloseTo(1.048, 6);
  expect(first?.high).toBeCloseTo(1.052, 6);
});

test.each(['ale', 'lager'] as const)('it falls, low below high, to the end of an %s', (kind) => {
  const band = expectedBand(1.05, 1.012, kind, 40);
  for (const [at, point] of band.entries()) {
    expect(point.low).toBeLessThan(point.high);
    expect(point.high).toBeLessThanOrEqual(band[at - 1]?.high ?? 2);
  }
  expect(band.at(-1)?.low).toBeCloseTo(1.009, 4);
  expect(band.at(-1)?.high).toBeCloseTo(1.015, 4);
});
