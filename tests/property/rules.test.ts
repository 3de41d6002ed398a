import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { checkChainAnswer, checkChainRequest } from '#shared/api/check.ts';
import { checkChain } from '#shared/chain/checkChain.ts';
import { checkLink, judgeLink, type LinkInput } from '#shared/chain/checkLink.ts';
import { inherit } from '#shared/chain/inherit.ts';
import type { HouseRuleKey } from '#shared/rules/houseRules.ts';
import { HOUSE_RULES } from '#shared/rules/houseRules.ts';
import { RULE_IDS, type RuleId, type Verdict } from '#shared/rules/vocabulary.ts';
import { anyBatch, anyLink, anyYeast, wholeLink } from '../support/arbitraries.ts';
import { findings, standing } from '../support/links.ts';

const rank: Record<Verdict, number> = { pour: 0, mind: 1, hold: 2 };

/** Keys whose finding comes as the limit falls, with those where it comes as the limit rises. */
const STRICTER_WHEN_HIGHER = new Set<HouseRuleKey>([
  'survivalMind',
  'survivalHold',
  'pitchMind',
  'pitchHold',
  'freeMind',
  'freeMindStrong',
  'freeBlowOff',
  'freeHold',
  'baggedShare',
]);
/** No limits of a verdict on a link: an amount of beer, and the pour check's. */
const NO_LIMIT = new Set<HouseRuleKey>([
  'leftAboveShare',
  'pourAboveMind',
  'pourBelowMind',
  'warmerCakeMind',
  'readingMinutes',
]);
const LIMITS = (Object.keys(HOUSE_RULES) as HouseRuleKey[]).filter((key) => !NO_LIMIT.has(key));

describe('identities of the rules', () => {
  test('each rule stands in one list at most, and nowhere only off the board', () => {
    fc.assert(
      fc.property(anyLink, (input) => {
        const answer = checkLink(input);
        const all = [
          ...answer.findings.map((one) => one.rule),
          ...answer.passed,
          ...answer.unchecked.map((one) => one.rule),
        ];
        expect(new Set(all).size).toBe(all.length);
        const nowhere = RULE_IDS.filter((rule) => !all.includes(rule));
        const recorded = input.pour.beersSinceCleaning !== undefined;
        expect(nowhere).toEqual(recorded ? ['cake-check'] : ['unwashed-vessel', 'cake-check']);
        for (const { missing } of answer.unchecked) expect(missing.length).toBeGreaterThan(0);
        const worst = Math.max(0, ...answer.findings.map((one) => rank[one.verdict]));
        expect(rank[answer.verdict]).toBe(worst);
      }),
    );
  });

  test('the verdict alone agrees with the answer in full', () => {
    fc.assert(
      fc.property(anyLink, (input) => {
        const answer = checkLink(input);
        const quick = judgeLink(input);
        const of = (verdict: Verdict) =>
          answer.findings.filter((one) => one.verdict === verdict).length;
        expect(quick).toMatchObject({
          verdict: answer.verdict,
          holds: of('hold'),
          minds: of('mind'),
          unchecked: answer.unchecked.length,
          worstRule: answer.findings[0]?.rule ?? null,
          deltaE00: answer.blend.deltaE00,
          reason: answer.findings[0]?.title ?? null,
        });
      }),
    );
  });

  test('sentences name no unknown and every figure is a number', () => {
    fc.assert(
      fc.property(anyLink, (input) => {
        const { findings: found, advice } = checkLink(input);
        for (const text of [
          ...found.flatMap((f) => [f.because, f.do]),
          ...advice.map((a) => a.text),
        ])
          expect(text).not.toMatch(/undefined|NaN|null|Infinity|\[object/);
        for (const { measures } of found)
          for (const { value, limit } of measures) {
            expect(Number.isFinite(value)).toBe(true);
            expect(limit === null || Number.isFinite(limit)).toBe(true);
          }
      }),
    );
  });

  test('a stricter house rule never softens a verdict', () => {
    const share = fc.double({ min: 0, max: 1, noNaN: true });
    fc.assert(
      fc.property(anyLink, fc.constantFrom(...LIMITS), share, (input, key, by) => {
        const now = input.rules[key];
        const { min, max } = HOUSE_RULES[key];
        const end = STRICTER_WHEN_HIGHER.has(key) ? max : min;
        const from = now ?? max;
        const stricter = { ...input.rules, [key]: from + (end - from) * by };
        const before = checkLink(input);
        const after = checkLink({ ...input, rules: stricter });
        expect(rank[after.verdict]).toBeGreaterThanOrEqual(rank[before.verdict]);
        for (const { rule, verdict } of before.findings)
          expect(['mind', 'hold'].indexOf(standing(after, rule))).toBeGreaterThanOrEqual(
            ['mind', 'hold'].indexOf(verdict),
          );
      }),
      { numRuns: 1000 },
    );
  });

  test('all volumes scaled together change no finding', () => {
    const scale = (value: number | undefined, by: number) =>
      value === undefined ? undefined : value * by;
    fc.assert(
      fc.property(anyLink, fc.constantFrom(0.1, 0.5, 3, 10), (input, by) => {
        const { earlier, later, pour, vessel } = input;
        const keepL = typeof pour.keepL === 'number' ? pour.keepL * by : pour.keepL;
        const scaled: LinkInput = {
          ...input,
          earlier: { ...earlier, volumeL: scale(earlier.volumeL, by) },
          later: { ...later, volumeL: scale(later.volumeL, by) },
          pour: { ...pour, keepL, leftAboveL: scale(pour.leftAboveL, by) },
          vessel: { ...vessel, capacityL: scale(vessel?.capacityL, by) },
        };
        expect(findings(checkLink(scaled))).toEqual(findings(checkLink(input)));
      }),
    );
  });

  test('keeping less cake never raises a shift of the blend', () => {
    fc.assert(
      fc.property(wholeLink, fc.double({ min: 0, max: 1, noNaN: true }), (input, part) => {
        const shifts = (keepL: number) => {
          const { blend } = checkLink({ ...input, pour: { ...input.pour, keepL } });
          return [
            Math.abs((blend.og ?? 0) - (input.later.og ?? 0)),
            Math.abs((blend.srm ?? 0) - (input.later.srm ?? 0)),
            Math.abs((blend.ibu ?? 0) - (input.later.ibu ?? 0)),
          ];
        };
        const more = shifts(2);
        shifts(2 * part).forEach((shift, i) =>
          expect(shift).toBeLessThanOrEqual((more[i] ?? 0) + 1e-9),
        );
      }),
    );
  });

  test('a batch and its own twin differ in nothing', () => {
    const alike: RuleId[] = [
      'light-to-dark',
      'mild-to-bitter',
      'gravity-jump',
      'strong-before-weak',
    ];
    fc.assert(
      fc.property(anyLink, (input) => {
        const answer = checkLink({ ...input, later: input.earlier });
        for (const rule of alike) expect(['mind', 'hold']).not.toContain(standing(answer, rule));
      }),
    );
  });

  test('a finding is of A, B, yeast, vessel, generation and inheritance alone', () => {
    fc.assert(
      fc.property(anyLink, anyBatch, (input, other) => {
        const once = checkLink(input);
        checkLink({ ...input, earlier: other });
        checkLink({ ...input, later: other });
        expect(checkLink(structuredClone(input))).toEqual(once);
        // What A hands down is read whether or not the caller has taken it in already.
        const taken = inherit(input.inherited, input.earlier);
        expect(checkLink({ ...input, inherited: taken })).toEqual(once);
      }),
    );
  });

  test('what one more fact decides was not decided otherwise before', () => {
    fc.assert(
      fc.property(wholeLink, fc.nat(), (input, pick) => {
        const keys = Object.keys(input.earlier).filter((key) => key !== 'id' && key !== 'trub');
        const key = keys[pick % keys.length] ?? '';
        const earlier = { ...input.earlier, [key]: undefined };
        const blind = checkLink({ ...input, earlier });
        const seen = checkLink(input);
        for (const rule of blind.passed) expect(standing(seen, rule)).toBe('passed');
        for (const { rule, verdict } of blind.findings)
          expect(rank[standing(seen, rule) as Verdict] ?? 0).toBeGreaterThanOrEqual(rank[verdict]);
      }),
    );
  });
});

describe('a chain', () => {
  test('its verdict is the worst of its links, and its answer is of the contract', () => {
    fc.assert(
      fc.property(anyYeast, fc.array(anyBatch, { minLength: 1, maxLength: 6 }), (yeast, beers) => {
        const batches = beers.map(({ dryHops, trub = 'some', ...rest }, i) => ({
          ...rest,
          trub,
          id: `${i}`,
          fg: rest.og === undefined ? rest.fg : Math.min(rest.fg ?? 1, rest.og),
          dryHop: dryHops,
        }));
        const request = checkChainRequest.parse(
          JSON.parse(JSON.stringify({ yeast, firstGeneration: 1, batches })),
        );
        const answer = checkChain(request);
        checkChainAnswer.parse(answer);
        expect(answer.links).toHaveLength(beers.length - 1);
        const worst = Math.max(0, ...answer.links.map((link) => rank[link.verdict]));
        expect(rank[answer.verdict]).toBe(worst);
        const { pour, mind, hold } = answer.chain.counts;
        expect(pour + mind + hold).toBe(answer.links.length);
      }),
    );
  });
});
