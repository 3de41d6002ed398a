import { describe, expect, test } from 'vitest';
import { checkPour, type PourCheck } from '#shared/pour/check.ts';
import { endsLeave } from '#shared/pour/standing.ts';
import type { Finding } from '#shared/rules/answer.ts';
import { DEFAULT_HOUSE_RULES } from '#shared/rules/resolve.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';
import { minutes } from '../../support/cooling.ts';

/** A clean ale with a window of 18 to 22 °C, one reading at the moment that is judged. */
const at = (c: number, change: Partial<PourCheck> = {}) =>
  checkPour({
    yeast: { kind: 'ale', pourMinC: 18, pourMaxC: 22 },
    at: minutes(0),
    readings: [{ at: minutes(0), c }],
    rules: DEFAULT_HOUSE_RULES,
    ...change,
  });
const found = (answer: ReturnType<typeof at>) =>
  answer.findings.map(({ rule, verdict }) => `${verdict} ${rule}`);

describe('what ends every leave', () => {
  const hold = (rule: RuleId): Finding => ({
    rule,
    verdict: 'hold',
    title: '',
    because: '',
    do: '',
    measures: [],
    basis: '',
  });
  test.each<[string, number, RuleId[], boolean]>([
    ['a temperature that kills', 38, [], true],
    ['not one that is merely too warm', 37.9, [], false],
    ['an allergen that is not declared', 20, ['tired-cake', 'allergen'], true],
    ['an overfull vessel', 20, ['headspace'], true],
    ['not a hold that somebody may take on', 20, ['tired-cake'], false],
  ])('%s', (_, c, holds, expected) => {
    expect(endsLeave({ wort: at(c), linkHolds: holds.map(hold) })).toBe(expected);
  });
});

describe('the window, its ends and its limits', () => {
  test.each([
    [20, []],
    [18, []],
    [22, []],
    [22.04, []],
    [22.1, ['mind too-warm']],
    [24, ['mind too-warm']],
    [24.1, ['hold too-warm']],
    [24.6, ['hold too-warm']],
    [37.9, ['hold too-warm']],
    [38, ['hold kills-yeast', 'hold too-warm']],
    [17.9, ['mind too-cold']],
    [12, ['mind too-cold']],
    [11.9, ['hold too-cold']],
  ])('%d °C', (c, expected) => {
    const answer = at(c);
    expect(found(answer)).toEqual(expected);
    const worst = expected.some((one) => one.startsWith('hold'));
    expect(answer.verdict).toBe(worst ? 'hold' : expected.length > 0 ? 'mind' : 'pour');
    expect(answer.overridable).toBe(worst && c < 38);
  });

  test('a yeast without a range of its own has that of its kind', () => {
    expect(at(20, { yeast: { kind: 'ale' } }).window).toEqual({ minC: 18, maxC: 22, own: false });
    const lager = at(34.9, { yeast: { kind: 'lager' } });
    expect(lager.window).toEqual({ minC: 10, maxC: 14, own: false });
    expect(found(lager)).toEqual(['hold too-warm']);
    expect(found(at(35, { yeast: { kind: 'lager' } }))).toEqual([
      'hold kills-yeast',
      'hold too-warm',
    ]);
  });

  test('a farmhouse yeast may be poured warm, up to its own limit', () => {
    const yeast = { kind: 'ale', pourMinC: 30, pourMaxC: 40, neverAboveC: 44 } as const;
    expect(found(at(39, { yeast }))).toEqual([]);
    expect(found(at(44, { yeast }))).toEqual(['hold kills-yeast', 'hold too-warm']);
  });
});

describe('readings', () => {
  test('none is a hold that nobody overrides', () => {
    const answer = at(20, { readings: [] });
    expect(found(answer)).toEqual(['hold no-reading']);
    expect(answer).toMatchObject({ overridable: false, readingC: null, ready: null });
  });

  test('one of 15 minutes ago is fresh, an older one is not', () => {
    const readings = [{ at: minutes(0), c: 20 }];
    expect(found(at(20, { readings, at: minutes(15) }))).toEqual([]);
    const old = at(20, { readings, at: minutes(15) + 1 });
    expect(found(old)).toEqual(['hold no-reading']);
    expect(old.overridable).toBe(false);
  });

  test('the latest speaks, in whatever order they come', () => {
    const readings = [
      { at: minutes(10), c: 21 },
      { at: minutes(0), c: 30 },
    ];
    expect(at(0, { readings, at: minutes(12) })).toMatchObject({ verdict: 'pour', readingC: 21 });
  });
});

describe('the cake', () => {
  const wort = { volumeL: 20, og: 1.05 };
  test('warmer than the wort by more than 6 °C', () => {
    expect(found(at(18, { wort, cake: { volumeL: 1, c: 24 } }))).toEqual([]);
    expect(found(at(18, { wort, cake: { volumeL: 1, c: 24.1 } }))).toEqual(['mind warmer-cake']);
  });
  test('unknown: no temperature together', () => {
    expect(at(20, { wort, cake: { volumeL: 1 } }).mixedC).toBeNull();
  });
});

describe('house rules', () => {
  test('a stricter or looser limit', () => {
    const rules = { ...DEFAULT_HOUSE_RULES, pourAboveMind: 0, pourBelowMind: 1, readingMinutes: 1 };
    expect(found(at(22.1, { rules }))).toEqual(['hold too-warm']);
    expect(found(at(16.9, { rules }))).toEqual(['hold too-cold']);
    expect(found(at(20, { rules, at: minutes(2) }))).toEqual(['hold no-reading']);
  });
});

test('the sheet’s own example: 33.1 °C, 25 minutes later 24.6 °C, on a cake at 17 °C', () => {
  const answer = at(0, {
    at: minutes(25),
    wort: { volumeL: 23, og: 1.076 },
    cake: { volumeL: 0.4, c: 17 },
    readings: [
      { at: minutes(0), c: 33.1 },
      { at: minutes(25), c: 24.6 },
    ],
  });
  expect(found(answer)).toEqual(['hold too-warm']);
  expect(answer).toMatchObject({ readingC: 24.6, overridable: true, ready: null });
  expect(answer.whyNot).toMatch(/Two readings are too few/);
  // The cake hardly cools the wort: 0.4 kg of 25.
  expect(answer.mixedC).toBe(24.5);
});
