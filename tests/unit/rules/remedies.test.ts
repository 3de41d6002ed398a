import { describe, expect, test } from 'vitest';
import type { BatchFacts, PourFacts } from '#shared/rules/facts.ts';
import type { RuleId } from '#shared/rules/vocabulary.ts';
import {
  ale,
  blonde,
  check,
  checkAsDated,
  CLEAN_ALE,
  paleAle,
  standing,
  type Case,
} from '../../support/links.ts';

/** Each remedy, done as its sentence says, clears the finding or makes a mind of the hold. */
const rank = { nowhere: 0, passed: 0, unchecked: 0, mind: 1, hold: 2 };

const remedyOf = (of: Case, rule: RuleId, dated = false): string => {
  const answer = (dated ? checkAsDated : check)(of);
  return answer.findings.find((one) => one.rule === rule)?.do ?? '';
};

const hops: BatchFacts['dryHops'] = [{ gramsPerLitre: 8, contained: 'loose', timing: 'on-cake' }];
const taken = {
  ...blonde(),
  dryHops: hops?.map((one) => ({ ...one, timing: 'after-taking' as const })),
};
const with_ = (more: Partial<BatchFacts>) => ({ ...blonde(), ...more });
const under = (more: Partial<BatchFacts>) => ({ ...paleAle(), ...more });

const done: [RuleId, string, RegExp, Case, Case][] = [
  [
    'same-yeast',
    'the chain’s yeast',
    /with the yeast of this chain/,
    { a: blonde(), b: paleAle(), pour: { otherYeast: { kind: 'lager' } } },
    { a: blonde(), b: paleAle() },
  ],
  [
    'light-to-dark',
    'swapped',
    /before dark/,
    {
      a: { ...ale('dark', 1.05, 40, 20), name: 'dark' },
      b: ale('b', 1.05, 3, 20),
      pour: { keepL: 'recommended' },
    },
    { a: ale('b', 1.05, 3, 20), b: ale('dark', 1.05, 40, 20), pour: { keepL: 'recommended' } },
  ],
  [
    'hops-in-cake',
    'taken before the hops',
    /before the dry hops/,
    { a: with_({ dryHops: hops }), b: paleAle() },
    { a: taken, b: paleAle() },
  ],
  [
    'gravity-jump',
    'a beer between',
    /1\.055 or more between/,
    { a: ale('a', 1.04, 6, 25), b: ale('b', 1.1, 6, 25) },
    { a: ale('m', 1.055, 6, 25), b: ale('b', 1.1, 6, 25) },
  ],
  [
    'strong-before-weak',
    'swapped',
    /before/,
    { a: ale('a', 1.08, 6, 25), b: ale('b', 1.04, 6, 25) },
    { a: ale('b', 1.04, 6, 25), b: ale('a', 1.08, 6, 25) },
  ],
  [
    'tired-cake',
    'counted',
    /Count the cells/,
    { a: ale('a', 1.09, 6, 25), b: ale('b', 1.09, 6, 25) },
    { a: { ...ale('a', 1.09, 6, 25), measuredCake: { viability: 0.9 } }, b: ale('b', 1.09, 6, 25) },
  ],
  [
    'tired-cake',
    'a weaker beer’s cake',
    /at most 1\.065 and 6\.5 % ABV/,
    { a: ale('a', 1.07, 6, 25), b: ale('b', 1.07, 6, 25) },
    { a: { ...ale('a', 1.065, 6, 25), fg: 1.018 }, b: ale('b', 1.07, 6, 25) },
  ],
  [
    'fermentation-temperature',
    'inside the range',
    /18 °C to 22 °C/,
    { a: with_({ fermentC: 25 }), b: under({ fermentC: 26 }) },
    { a: with_({ fermentC: 22 }), b: under({ fermentC: 22 }) },
  ],
  [
    'generation',
    'a fresh pack',
    /fresh pack/,
    { a: blonde(), b: paleAle(), rest: { generation: 12 } },
    { a: blonde(), b: paleAle(), rest: { generation: 1 } },
  ],
  [
    'time-under-beer',
    'late: taken by the day',
    /Sat 3 April or earlier/,
    { a: with_({ daysUnderBeer: 70 }), b: paleAle() },
    { a: with_({ daysUnderBeer: 28 }), b: paleAle() },
  ],
  [
    'time-under-beer',
    'early: taken from the day',
    /Thu 11 March or later/,
    { a: with_({ daysUnderBeer: 3 }), b: paleAle() },
    { a: with_({ daysUnderBeer: 5 }), b: paleAle() },
  ],
  [
    'pitch-amount',
    'none kept: the part',
    /^Keep /,
    { a: blonde(), b: paleAle(), pour: { keepL: 0 } },
    { a: blonde(), b: paleAle(), pour: { keepL: 'recommended' } },
  ],
  [
    'pitch-amount',
    'too much: the part',
    /^Keep /,
    { a: blonde(), b: paleAle(), yeast: { ...CLEAN_ALE, character: true } },
    {
      a: blonde(),
      b: paleAle(),
      yeast: { ...CLEAN_ALE, character: true },
      pour: { keepL: 'recommended' },
    },
  ],
  [
    'wild-culture',
    'declared',
    /Declare bacteria/,
    { a: with_({ cultures: ['bacteria'] }), b: paleAle() },
    { a: with_({ cultures: ['bacteria'] }), b: under({ cultures: ['bacteria'] }) },
  ],
  [
    'allergen',
    'declared',
    /Declare milk/,
    { a: with_({ allergens: ['milk'] }), b: paleAle() },
    { a: with_({ allergens: ['milk'] }), b: under({ allergens: ['milk'] }) },
  ],
  [
    'flavour-left',
    'taken before',
    /before the smoke goes in/,
    { a: with_({ additions: [{ what: 'smoke', timing: 'on-cake' }] }), b: paleAle() },
    { a: with_({ additions: [{ what: 'smoke', timing: 'after-taking' }] }), b: paleAle() },
  ],
  [
    'stopped-yeast',
    'taken before',
    /before the stabiliser/,
    { a: with_({ additions: [{ what: 'stabiliser', timing: 'on-cake' }] }), b: paleAle() },
    { a: with_({ additions: [{ what: 'stabiliser', timing: 'after-taking' }] }), b: paleAle() },
  ],
  [
    'unwashed-vessel',
    'cleaned',
    /clean the vessel/,
    { a: blonde(), b: paleAle(), pour: { beersSinceCleaning: 5 } },
    { a: blonde(), b: paleAle(), pour: { beersSinceCleaning: 1 } },
  ],
  [
    'headspace',
    'a blow-off tube',
    /blow-off tube/,
    { a: blonde(), b: paleAle(), rest: { vessel: { capacityL: 28.5, blowOff: false } } },
    { a: blonde(), b: paleAle(), rest: { vessel: { capacityL: 28.5, blowOff: true } } },
  ],
];

describe('a remedy that is done clears or softens its finding', () => {
  test.each(done)('%s: %s', (rule, _name, says, before, after) => {
    expect(remedyOf(before, rule)).toMatch(says);
    expect(rank[standing(check(after), rule)]).toBeLessThan(rank[standing(check(before), rule)]);
  });

  /** The litres that a remedy names, to use them as they are written. */
  const litresIn = (text: string): number => {
    const [, number = '', unit = ''] = /([\d.]+) (mL|L)/.exec(text) ?? [];
    return Number(number) / (unit === 'mL' ? 1000 : 1);
  };

  test.each(['light-to-dark', 'mild-to-bitter'] as const)('%s: keep less of the cake', (rule) => {
    const link = (pour: PourFacts): Case => ({
      a: ale('a', 1.05, 20, 60),
      b: ale('b', 1.05, 6, 20),
      pour,
    });
    const remedy = remedyOf(link({}), rule);
    expect(remedy).toMatch(/^Keep .* of the cake/);
    const part = check(link({ keepL: litresIn(remedy) }));
    expect(rank[standing(part, rule)]).toBeLessThan(rank[standing(check(link({})), rule)]);
  });

  test('pitch-amount: brew less on a small cake', () => {
    const a = { ...blonde(), volumeL: 5 };
    const b = { ...ale('b', 1.09, 6, 25), volumeL: 30 };
    const remedy = remedyOf({ a, b }, 'pitch-amount');
    expect(remedy).toMatch(/^Brew at most/);
    const smaller = check({ a, b: { ...b, volumeL: litresIn(remedy) } });
    expect(standing(smaller, 'pitch-amount')).toBe('passed');
  });

  test.each([24, 26])('headspace: a vessel as large as is said, instead of %d L', (capacityL) => {
    const link = (litres: number): Case => ({
      a: blonde(),
      b: paleAle(),
      rest: { vessel: { capacityL: litres, blowOff: false } },
    });
    const remedy = remedyOf(link(capacityL), 'headspace');
    expect(remedy).toMatch(/in a vessel of/);
    expect(standing(check(link(litresIn(remedy))), 'headspace')).toBe('passed');
  });

  test('brew-day and cake-wait: brewed, or taken, on the day that is named', () => {
    const early: Case = { a: blonde(), b: under({ brewOn: '2027-03-18' }) };
    expect(remedyOf(early, 'brew-day', true)).toMatch(/on Sat 20 March or after/);
    const late: Case = { a: blonde(), b: under({ brewOn: '2027-03-25' }) };
    expect(remedyOf(late, 'cake-wait', true)).toMatch(/on Thu 25 March/);
    expect(standing(checkAsDated({ ...late, pour: { takenOn: '2027-03-25' } }), 'cake-wait')).toBe(
      'passed',
    );
    const onTheDay = checkAsDated({ ...early, b: under({ brewOn: '2027-03-20' }) });
    expect(standing(onTheDay, 'brew-day')).toBe('passed');
  });
});
