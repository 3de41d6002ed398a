import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkPour, type PourCheck } from '#shared/pour/check.ts';
import { forecast } from '#shared/pour/forecast.ts';
import { mixedTemperature } from '#shared/pour/mixing.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import { START } from '../support/cooling.ts';

const celsius = fc.integer({ min: -50, max: 1100 }).map((tenths) => tenths / 10);
const readings = fc.array(
  fc.record({ at: fc.integer({ min: 0, max: 600 }).map((m) => START + m * 60_000), c: celsius }),
  { maxLength: 9 },
);
const check: fc.Arbitrary<PourCheck> = fc.record({
  yeast: fc.oneof(
    fc.record({ kind: fc.constantFrom('ale' as const, 'lager' as const) }),
    fc.tuple(celsius, celsius).map(([a, b]) => ({
      kind: 'ale' as const,
      pourMinC: Math.min(a, b),
      pourMaxC: Math.max(a, b),
    })),
  ),
  at: fc.integer({ min: 600, max: 640 }).map((m) => START + m * 60_000),
  readings,
  cake: fc.option(fc.record({ volumeL: fc.constant(1), c: celsius }), { nil: undefined }),
  coolantC: fc.option(celsius, { nil: undefined }),
  rules: fc
    .record({
      pourAboveMind: fc.integer({ min: 0, max: 15 }),
      pourBelowMind: fc.integer({ min: 0, max: 15 }),
      warmerCakeMind: fc.integer({ min: 1, max: 20 }),
      readingMinutes: fc.integer({ min: 1, max: 60 }),
    })
    .map((changes) => ({ ...DEFAULT_HOUSE_RULES, ...changes })),
});
const RANK = { pour: 0, mind: 1, hold: 2 };

describe('the pour check, whatever is read', () => {
  test('answers plainly: a verdict that is the worst of its findings, no unknown in a sentence', () => {
    fc.assert(
      fc.property(check, (of) => {
        const answer = checkPour(of);
        expect(RANK[answer.verdict]).toBe(
          Math.max(0, ...answer.findings.map(({ verdict }) => RANK[verdict])),
        );
        for (const { because, title } of answer.findings)
          expect(because + title).not.toMatch(/undefined|NaN|null|Infinity/);
        expect(String(answer.whyNot)).not.toMatch(/undefined|NaN|Infinity/);
        expect(answer.ready !== null && answer.whyNot !== null).toBe(false);
        if (answer.overridable) expect(answer.verdict).toBe('hold');
        const rules = answer.findings.map(({ rule }) => rule);
        if (rules.includes('kills-yeast') || rules.includes('no-reading'))
          expect(answer.overridable).toBe(false);
      }),
      { numRuns: 400 },
    );
  });

  test('a stricter house rule never softens the verdict', () => {
    fc.assert(
      fc.property(check, fc.integer({ min: 0, max: 5 }), (of, less) => {
        const { rules } = of;
        const stricter = {
          ...rules,
          pourAboveMind: Math.max(0, rules.pourAboveMind - less),
          pourBelowMind: Math.max(0, rules.pourBelowMind - less),
          warmerCakeMind: Math.max(1, rules.warmerCakeMind - less),
          readingMinutes: Math.max(1, rules.readingMinutes - less),
        };
        expect(RANK[checkPour({ ...of, rules: stricter }).verdict]).toBeGreaterThanOrEqual(
          RANK[checkPour(of).verdict],
        );
      }),
    );
  });

  test('the order of readings says nothing', () => {
    const distinct = fc.uniqueArray(fc.integer({ min: 0, max: 300 }), { maxLength: 8 });
    fc.assert(
      fc.property(distinct, fc.array(celsius, { minLength: 8, maxLength: 8 }), (at, cs) => {
        const given = at.map((m, n) => ({ at: START + m * 60_000, c: cs[n] ?? 20 }));
        const window = { minC: 18, maxC: 22 };
        const one = forecast({ readings: given, window });
        const other = forecast({ readings: [...given].reverse(), window });
        expect({ ...other, ahead: null }).toEqual({ ...one, ahead: null });
      }),
    );
  });

  test('a forecast lies inside its own interval, after the first reading', () => {
    fc.assert(
      fc.property(readings, (given) => {
        const { ready } = forecast({ readings: given, window: { minC: 18, maxC: 22 } });
        if (!ready) return;
        expect(ready.earliest).toBeLessThanOrEqual(ready.at);
        expect(ready.latest).toBeGreaterThanOrEqual(ready.at);
        expect(ready.earliest).toBeGreaterThanOrEqual(Math.min(...given.map(({ at }) => at)));
      }),
    );
  });

  test('wort and cake together lie between the two', () => {
    fc.assert(
      fc.property(celsius, celsius, fc.integer({ min: 1, max: 500 }), (wortC, c, decilitres) => {
        const cake = { volumeL: decilitres / 100, c };
        const together = mixedTemperature({ volumeL: 20, og: 1.05 }, wortC, cake);
        expect(together).toBeGreaterThanOrEqual(Math.min(wortC, c) - 0.05);
        expect(together).toBeLessThanOrEqual(Math.max(wortC, c) + 0.05);
      }),
    );
  });
});
