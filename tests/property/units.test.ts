import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { beerLab } from '#shared/units/colour.ts';
import { addDays, daysBetween, weekday } from '#shared/units/day.ts';
import { deltaE00 } from '#shared/units/deltaE.ts';
import { apparentExtract, platoFromSg, sgFromPlato } from '#shared/units/gravity.ts';
import {
  format,
  formatBare,
  parse,
  QUANTITY_KINDS,
  shown,
  unitOf,
  type QuantityKind,
} from '#shared/units/quantity.ts';

const between = (min: number, max: number) =>
  fc.double({ min, max, noNaN: true, noDefaultInfinity: true });

const prefs = fc.record({
  system: fc.constantFrom('metric', 'us'),
  gravity: fc.constantFrom('sg', 'plato'),
  colour: fc.constantFrom('srm', 'ebc'),
  temperature: fc.constantFrom('c', 'f'),
});

/** The range of each kind's contract, in the stored unit. */
const RANGES: Record<QuantityKind, [number, number]> = {
  volume: [0.5, 5000],
  smallVolume: [0, 50],
  mass: [0, 5000],
  smallMass: [0, 50],
  hopRate: [0, 50],
  gravity: [0.985, 1.2],
  colour: [0, 100],
  bitterness: [0, 200],
  alcohol: [0, 20],
  temperature: [-5, 110],
  temperatureStep: [-20, 100],
};

/** At most this much is lost in writing: half of a last digit, and a share of a large value. */
const LOST: Record<QuantityKind, [number, number]> = {
  volume: [0.02, 0.006],
  smallVolume: [0.002, 0.006],
  mass: [0.006, 0.006],
  smallMass: [0.0015, 0.006],
  hopRate: [0.038, 0.006],
  gravity: [0.0006, 0],
  colour: [0.051, 0.025],
  bitterness: [0.051, 0],
  alcohol: [0.051, 0],
  temperature: [0.051, 0],
  temperatureStep: [0.051, 0],
};

describe('gravity', () => {
  test('°P and SG turn into each other and back', () => {
    fc.assert(
      fc.property(between(0.0001, 60), (plato) => {
        expect(platoFromSg(sgFromPlato(plato))).toBeCloseTo(plato, 9);
      }),
    );
    fc.assert(
      fc.property(between(0.98, 1.25), (sg) => {
        expect(sgFromPlato(apparentExtract(sg))).toBeCloseTo(sg, sg === 1 ? 4 : 10);
      }),
    );
  });
  test('more extract, higher gravity', () => {
    fc.assert(
      fc.property(between(-5, 500), between(0.001, 50), (plato, more) => {
        expect(sgFromPlato(plato + more)).toBeGreaterThan(sgFromPlato(plato));
      }),
    );
  });
});

describe('days', () => {
  const day = fc.integer({ min: 0, max: 100_000 }).map((n) => addDays('1900-01-01', n));
  test('what is added is what lies between', () => {
    fc.assert(
      fc.property(day, fc.integer({ min: -20_000, max: 8_000 }), (from, n) => {
        const to = addDays(from, n);
        expect(daysBetween(from, to)).toBe(n);
        expect(addDays(to, -n)).toBe(from);
        expect((weekday(from) - 1 + (((n % 7) + 7) % 7)) % 7).toBe(weekday(to) - 1);
      }),
    );
  });
  test('days sort as text', () => {
    fc.assert(
      fc.property(day, day, (a, b) => {
        expect(Math.sign(daysBetween(a, b))).toBe(a < b ? 1 : a > b ? -1 : 0);
      }),
    );
  });
});

describe.each(QUANTITY_KINDS)('%s', (kind) => {
  const value = between(...RANGES[kind]);

  test('what is written reads as itself', () => {
    fc.assert(
      fc.property(value, prefs, (v, p) => {
        for (const write of [format, formatBare]) {
          const text = write(kind, v, p);
          const parsed = parse(kind, text, p);
          expect(parsed.ok).toBe(true);
          if (!parsed.ok) return;
          expect(write(kind, parsed.value, p)).toBe(text);
          const [digit, share] = LOST[kind];
          expect(Math.abs(parsed.value - v)).toBeLessThanOrEqual(digit + share * Math.abs(v));
        }
      }),
    );
  });

  test('typed text shows as typed after saving and reading back', () => {
    const text = fc
      .tuple(value, fc.integer({ min: 0, max: 4 }), fc.constantFrom('.', ','), fc.boolean())
      .map(
        ([v, digits, mark, spaced]) =>
          `${v.toFixed(digits).replace('.', mark)}${spaced ? ' ' : ''}`,
      );
    fc.assert(
      fc.property(text, prefs, (typedText, p) => {
        const parsed = parse(kind, typedText, p);
        expect(parsed.ok).toBe(true);
        if (!parsed.ok) return;
        const saved: unknown = JSON.parse(
          JSON.stringify({ value: parsed.value, text: typedText, unit: unitOf(kind, p) }),
        );
        const { value: stored, ...typed } = saved as { value: number; text: string; unit: string };
        expect(shown(kind, stored, typed, p)).toBe(typedText);
      }),
    );
  });

  test('any text at all is read or refused with words, never anything else', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), prefs, (text, p) => {
        const parsed = parse(kind, text, p);
        expect(parsed.ok ? Number.isFinite(parsed.value) : parsed.why.startsWith('Write ')).toBe(
          true,
        );
      }),
    );
  });
});

test('a colour does not differ from itself, and differs the same both ways', () => {
  fc.assert(
    fc.property(between(0, 100), between(0, 100), (one, other) => {
      const [p, q] = [beerLab(one, 5), beerLab(other, 5)];
      expect(deltaE00(p, p)).toBe(0);
      expect(deltaE00(p, q)).toBeCloseTo(deltaE00(q, p), 9);
    }),
  );
});
